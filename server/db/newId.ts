import { randomBytes } from 'node:crypto'

/** A new identity, safe in an address: 96 random bits in 16 characters. */
export function newId(): string {
  return randomBytes(12).toString('base64url')
}
