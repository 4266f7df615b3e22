/** Why the app or a command won't begin, in words for whoever runs it: printed without a stack. */
export class StartRefusal extends Error {}
