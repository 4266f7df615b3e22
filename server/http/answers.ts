/** JSON that was already made, by SQLite for instance: sent as it stands. */
export class JsonText {
  constructor(readonly text: string) {}
}

/** A file to save, under the name it should get. */
export class FileAnswer {
  constructor(
    readonly content: Buffer,
    readonly mediaType: string,
    readonly fileName: string,
  ) {}
}

/** The handler wrote the response itself: a stream of events. */
export class AlreadyAnswered {
  readonly isAnswered = true
}

export type Answer<R> = R | JsonText | FileAnswer | AlreadyAnswered
