/** A command that was not understood, said in a sentence. */
export class UsageError extends Error {}
