import { ZxcvbnFactory } from '@zxcvbn-ts/core'
import { adjacencyGraphs, dictionary } from '@zxcvbn-ts/language-common'
import { invalid } from '../../errors/AppError.ts'

/** On the estimator's scale of 0 to 4: from here a guesser needs more than a hundred million tries. */
const STRONG_ENOUGH = 3

let estimator: ZxcvbnFactory | null = null

/** Loaded on first need: the lists of common passwords take a moment. */
function strengthEstimator(): ZxcvbnFactory {
  estimator ??= new ZxcvbnFactory({ dictionary, graphs: adjacencyGraphs })
  return estimator
}

/**
 * Refuses a new password that a guesser would try early: common ones and their spellings with figures, runs of keys, repeats,
 * and the person's own name or address. No rules of composition. Length is the schema's to check.
 * @param field the body's field that holds it
 */
export function refuseGuessable(password: string, person: { email: string; name: string }, field = 'newPassword'): void {
  const isGuessable = strengthEstimator().check(password, wordsAbout(person)).score < STRONG_ENOUGH
  if (!isGuessable) return
  throw invalid([
    {
      path: field,
      code: 'guessable',
      message: 'is too easy to guess; three or four words that have nothing to do with each other are better',
    },
  ])
}

function wordsAbout({ email, name }: { email: string; name: string }): string[] {
  const [mailbox = ''] = email.split('@')
  const parts = [...name.split(/\s+/), ...mailbox.split(/[._+-]+/)]
  const whole = [email, mailbox, name, mailbox.replace(/[._+-]/g, ''), name.replace(/\s+/g, '')]
  return [...whole, ...parts, 'quoinbook'].map((word) => word.toLowerCase()).filter((word) => word.length >= 3)
}
