import { FormulaError, PART, type Span } from './formulaError.ts'
import { FUNCTIONS, isFunctionName, SUM_ROOMS } from './formulaFunctions.ts'
import { FORMULA_MAX_DEPTH } from './formulaLimits.ts'
import { findMeasure, type NameScope } from './measureNames.ts'
import type { ParsedNode } from './parsedNode.ts'
import type { ArithmeticOperator, ComparisonOperator, FormulaNode } from './syntaxTree.ts'
import type { Token } from './tokens.ts'

const ARITHMETIC: ReadonlySet<string> = new Set<ArithmeticOperator>(['+', '-', '*', '/', '^'])
const COMPARISONS: ReadonlySet<string> = new Set<ComparisonOperator>(['<', '<=', '>', '>=', '==', '!='])

/**
 * The parser's tree as our own, which holds only what is allowed. The tree says how things hang together; what they are, and where they stand, comes from the tokens,
 * which the tree holds in the same order. A tree of any other kind, or in any other order, is refused.
 */
export function readTree(tree: ParsedNode, tokens: readonly Token[], scope: NameScope): FormulaNode {
  const reader = new TreeReader(tokens)
  const node = reader.read(tree, scope, 0)
  reader.expectEnd()
  return node
}

class TreeReader {
  private place = 0

  constructor(private readonly tokens: readonly Token[]) {}

  read(node: ParsedNode | undefined, scope: NameScope, depth: number): FormulaNode {
    if (depth > FORMULA_MAX_DEPTH) throw new FormulaError('too-deep', `The formula nests more than ${FORMULA_MAX_DEPTH} deep.`, this.here())
    switch (node?.type) {
      case 'ConstantNode':
        return this.readNumber()
      case 'SymbolNode':
        return this.readName(scope)
      case 'ParenthesisNode':
        return this.readBrackets(node, scope, depth)
      case 'OperatorNode':
        return node.args?.length === 1 ? this.readSigned(node, scope, depth) : this.readOperator(node, scope, depth)
      case 'ConditionalNode':
        return this.readCondition(node, scope, depth)
      case 'FunctionNode':
        return this.readCall(node, scope, depth)
      case 'RelationalNode':
        throw new FormulaError('not-allowed', 'Compare two things at a time.', this.here())
      default:
        throw this.notAllowed()
    }
  }

  expectEnd(): void {
    if (this.place !== this.tokens.length) throw this.notAllowed()
  }

  private readNumber(): FormulaNode {
    const { text, at } = this.take('number')
    return { kind: 'number', value: Number(text), at }
  }

  private readName(scope: NameScope): FormulaNode {
    const { text, at } = this.take('name')
    return { kind: 'measure', measure: findMeasure(text, scope, at), at }
  }

  private readBrackets({ content }: ParsedNode, scope: NameScope, depth: number): FormulaNode {
    const from = this.takeSign('(').at[0]
    // How deep brackets nest was counted before the text was parsed.
    const node = this.read(content, scope, depth)
    return { ...node, at: [from, this.takeSign(')').at[1]] }
  }

  private readSigned({ args }: ParsedNode, scope: NameScope, depth: number): FormulaNode {
    const sign = this.take('sign')
    if (sign.text !== '-' && sign.text !== '+') throw this.notAllowed()
    const argument = this.read(args?.[0], scope, depth + 1)
    const at: Span = [sign.at[0], argument.at[1]]
    return sign.text === '-' ? { kind: 'negate', argument, at } : { ...argument, at }
  }

  private readOperator({ args }: ParsedNode, scope: NameScope, depth: number): FormulaNode {
    if (args?.length !== 2) throw this.notAllowed()
    // A long sum hangs from its left end: that is length, not depth.
    const left = this.read(args[0], scope, depth)
    const operator = this.take('sign').text
    const right = this.read(args[1], scope, depth + 1)
    const at: Span = [left.at[0], right.at[1]]
    if (ARITHMETIC.has(operator)) return { kind: 'arithmetic', operator: operator as ArithmeticOperator, left, right, at }
    if (COMPARISONS.has(operator)) return { kind: 'comparison', operator: operator as ComparisonOperator, left, right, at }
    throw this.notAllowed()
  }

  private readCondition({ condition, trueExpr, falseExpr }: ParsedNode, scope: NameScope, depth: number): FormulaNode {
    const test = this.read(condition, scope, depth + 1)
    this.takeSign('?')
    const yes = this.read(trueExpr, scope, depth + 1)
    this.takeSign(':')
    const no = this.read(falseExpr, scope, depth + 1)
    return { kind: 'condition', test, yes, no, at: [test.at[0], no.at[1]] }
  }

  private readCall({ args = [] }: ParsedNode, scope: NameScope, depth: number): FormulaNode {
    const { text: name, at: nameAt } = this.take('name')
    this.takeSign('(')
    const isSumRooms = name === SUM_ROOMS
    if (isSumRooms && scope === 'each-room') throw new FormulaError('not-allowed', 'sum_rooms stands inside sum_rooms.', nameAt)
    const read = args.map((argument, index) => {
      if (index > 0) this.takeSign(',')
      return this.read(argument, isSumRooms ? 'each-room' : scope, depth + 1)
    })
    const at: Span = [nameAt[0], this.takeSign(')').at[1]]
    const [first] = read
    if (isSumRooms && read.length === 1 && first) return { kind: 'sum-rooms', argument: first, at }
    if (!isFunctionName(name)) throw new FormulaError('bad-syntax', `sum_rooms takes one argument, as sum_rooms(wall_area).`, at)
    checkCount(name, read.length, at)
    return { kind: 'call', name, args: read, at }
  }

  private take(kind: Token['kind']): Token {
    const token = this.tokens[this.place]
    if (token?.kind !== kind) throw this.notAllowed()
    this.place += 1
    return token
  }

  private takeSign(sign: string): Token {
    const token = this.take('sign')
    if (token.text !== sign) throw this.notAllowed()
    return token
  }

  private here(): Span {
    return this.tokens[this.place]?.at ?? this.tokens.at(-1)?.at ?? [0, 0]
  }

  private notAllowed(): FormulaError {
    return new FormulaError(
      'not-allowed',
      `${PART} has no place in a formula. It takes numbers, measures, + - * / ^, brackets, comparisons, ? : and functions.`,
      this.here(),
    )
  }
}

function checkCount(name: keyof typeof FUNCTIONS, count: number, at: Span): void {
  const { least, most } = FUNCTIONS[name]
  if (count >= least && count <= most) return
  const wanted = least === most ? 'one argument' : name === 'round' ? 'one or two arguments' : 'at least one argument'
  throw new FormulaError('bad-syntax', `${name} takes ${wanted}.`, at)
}
