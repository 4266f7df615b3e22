import { demoAccounts } from '../../seed/demoAccounts.ts'
import type { EstimateWhole } from '../../shared/schemas/estimate.ts'
import { estimateDocumentOf } from './estimateDocumentOf.ts'

/** Benches ask more often than people do. */
export const UNLIMITED = { REQUESTS_PER_MINUTE: '100000000' }

export interface BenchSession {
  url: string
  /** The session's cookie as a request header says it. */
  cookie: string
}

export interface ImportedHouse {
  houseId: string
  estimateId: string
}

/** Signs in as the estimator of the demo. Throws when that fails. */
export async function openBenchSession(url: string): Promise<BenchSession> {
  const { email, password } = demoAccounts.find(({ role }) => role === 'estimator')!
  const answer = await fetch(`${url}/api/sessions`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: url },
    body: JSON.stringify({ email, password }),
  })
  if (!answer.ok) throw new Error(`The bench could not sign in: ${await answer.text()}`)
  return { url, cookie: answer.headers.getSetCookie()[0]!.split(';')[0]! }
}

/** Adds a house with an estimate of so many invented lines. */
export async function importHouse({ url, cookie }: BenchSession, lineCount: number): Promise<ImportedHouse> {
  const answer = await fetch(`${url}/api/houses/import`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: url, cookie },
    body: JSON.stringify(estimateDocumentOf(lineCount)),
  })
  if (!answer.ok) throw new Error(`The bench could not import its estimate: ${await answer.text()}`)
  const { house, estimateId } = (await answer.json()) as { house: { id: string }; estimateId: string }
  return { houseId: house.id, estimateId }
}

export async function readWholeEstimate({ url, cookie }: BenchSession, estimateId: string): Promise<EstimateWhole> {
  const answer = await fetch(`${url}/api/estimates/${estimateId}`, { headers: { cookie } })
  return (await answer.json()) as EstimateWhole
}
