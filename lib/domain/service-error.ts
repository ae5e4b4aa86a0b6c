/**
 * An expected failure: a code for programs, a sentence for people (what, where, what to do), and where it helps the
 * sentence for each field of the input.
 */
export type ServiceError<Code extends string = string> = {
  readonly code: Code
  readonly message: string
  readonly fields?: Readonly<Record<string, string>>
}

export type InvalidInput = ServiceError<'invalid_input'> & {
  readonly fields: Readonly<Record<string, string>>
}
