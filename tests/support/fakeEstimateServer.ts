import { openEstimate, toEstimateInput } from '../../shared/engine/index.ts'
import type { EstimateWhole, Line, SavedLine } from '../../shared/schemas/estimate.ts'
import { ProblemError, unreachable } from '../../src/api/ProblemError.ts'
import type { EstimateCalls } from '../../src/composables/estimateModel.ts'
import { buildLine } from './buildEstimateWhole.ts'

/**
 * The estimate's routes in memory, with their versions and refusals: what the page's model is tested against.
 * `log` names the writes in their order; `elsewhere` does what another person would.
 */
export function fakeEstimateServer(first: EstimateWhole) {
  const state = structuredClone(first)
  const removed = new Map<string, Line>()
  const answers = new Map<string, SavedLine>()
  const log: string[] = []
  let isDown = false
  let refusal: ProblemError | null = null
  let lastId = 0

  function whole(): EstimateWhole {
    return structuredClone(state)
  }

  function answered(line: Line): SavedLine {
    state.estimate.version += 1
    state.estimate.totals = openEstimate(toEstimateInput(state)).totals()
    return structuredClone({ line, totals: state.estimate.totals, estimateVersion: state.estimate.version })
  }

  /** Each call takes a moment, as a real one does, and may fail on the way. */
  async function arrive(what: string): Promise<void> {
    await Promise.resolve()
    if (isDown) throw unreachable()
    log.push(what)
    if (refusal) {
      const problem = refusal
      refusal = null
      throw problem
    }
  }

  function find(id: string): Line {
    const line = state.lines.find((known) => known.id === id)
    if (!line) throw new ProblemError({ status: 404, code: 'not-found', detail: 'There is no such line.' })
    return line
  }

  function findFresh(id: string, version: number): Line {
    const line = find(id)
    if (line.version === version) return line
    throw new ProblemError({ status: 412, code: 'stale', detail: 'Somebody else changed this.', current: structuredClone(line) })
  }

  function placeBelow(afterLineId: string | null | undefined, line: Line): void {
    const at = afterLineId == null ? state.lines.length : state.lines.findIndex(({ id }) => id === afterLineId) + 1
    state.lines.splice(at, 0, line)
    state.lines.forEach((known, index) => (known.position = (index + 1) * 1000))
  }

  const calls: EstimateCalls = {
    async addLine(_estimateId, { afterLineId, ...fields }, idempotencyKey) {
      await arrive(`add ${fields.description ?? ''}`)
      const known = answers.get(idempotencyKey)
      if (known) return structuredClone(known)
      lastId += 1
      const line = buildLine({ ...fields, id: `added-${lastId}`, version: 1 })
      placeBelow(afterLineId, line)
      const answer = answered(line)
      answers.set(idempotencyKey, answer)
      return answer
    },
    async updateLine({ id, version }, patch) {
      await arrive(`update ${id} ${Object.keys(patch).join(' ')}`)
      return answered(Object.assign(findFresh(id, version), patch, { version: version + 1 }))
    },
    async removeLine({ id, version }) {
      await arrive(`remove ${id}`)
      const line = findFresh(id, version)
      line.version += 1
      removed.set(id, line)
      state.lines = state.lines.filter((known) => known !== line)
      return answered(line)
    },
    async restoreLine({ id }) {
      await arrive(`restore ${id}`)
      const line = removed.get(id)
      if (!line) throw new ProblemError({ status: 409, code: 'not-removed', detail: 'It was not removed.' })
      removed.delete(id)
      line.version += 1
      state.lines = [...state.lines, line].sort((a, b) => a.position - b.position)
      return answered(line)
    },
    async orderLines(_estimateId, ids) {
      await arrive(`order ${ids.join(' ')}`)
      state.lines = ids.map(find)
      state.lines.forEach((line, index) => (line.position = (index + 1) * 1000))
      state.estimate.version += 1
      return structuredClone({ lines: state.lines, totals: state.estimate.totals, estimateVersion: state.estimate.version })
    },
    async updateEstimate({ version }, { settings }) {
      await arrive(`settings ${Object.keys(settings ?? {}).join(' ')}`)
      if (version !== state.estimate.version) {
        throw new ProblemError({
          status: 412,
          code: 'stale',
          detail: 'Somebody else changed this.',
          current: structuredClone(state.estimate),
        })
      }
      state.estimate.version += 1
      state.estimate.settings = { ...state.estimate.settings, ...settings }
      return structuredClone(state.estimate)
    },
  }

  return {
    calls,
    log,
    whole,
    line: (id: string) => state.lines.find((known) => known.id === id),
    /** Another person changes a line, adds one or removes one. */
    elsewhere: {
      change(id: string, patch: Partial<Line>): void {
        Object.assign(find(id), patch)
        find(id).version += 1
        state.estimate.version += 1
      },
      add(line: Line): void {
        state.lines.push(line)
        state.estimate.version += 1
      },
      remove(id: string): void {
        removed.set(id, find(id))
        state.lines = state.lines.filter((line) => line.id !== id)
        state.estimate.version += 1
      },
      changeSettings(settings: Partial<EstimateWhole['estimate']['settings']>): void {
        Object.assign(state.estimate.settings, settings)
        state.estimate.version += 1
      },
    },
    setDown(down: boolean): void {
      isDown = down
    },
    refuseNext(problem: ProblemError): void {
      refusal = problem
    },
  }
}
