import type { Response } from 'express'
import { AlreadyAnswered, FileAnswer, JsonText } from './answers.ts'

/** Writes what a handler returned. */
export function sendAnswer(res: Response, status: number, answer: unknown): void {
  if (answer instanceof AlreadyAnswered) return
  res.status(status)
  if (answer instanceof FileAnswer) {
    res.attachment(answer.fileName).type(answer.mediaType).send(answer.content)
    return
  }
  if (answer === undefined) {
    res.end()
    return
  }
  res.type('json').send(jsonOf(answer))
}

/** The JSON text of an answer. */
export function jsonOf(answer: unknown): string {
  return answer instanceof JsonText ? answer.text : JSON.stringify(answer)
}
