/** Why no inductance can be given, and a sentence that says so. */
export type InductanceRefusal = {
  readonly code:
    | 'not_finite'
    | 'not_positive'
    | 'zero_length'
    | 'overlap'
    | 'too_thick'
    | 'too_few_points'
    | 'self_intersecting'
    | 'no_area'
    | 'out_of_range'
  readonly message: string
}

export const refusal = (code: InductanceRefusal['code'], message: string): InductanceRefusal => ({
  code,
  message,
})
