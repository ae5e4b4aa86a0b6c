/** Why something cannot be computed, in the form of RFC 9457 “problem details”, as the web interface answers too. */
export class ComputeProblem extends Error {
  readonly #code: string
  readonly #fields: Readonly<Record<string, string>>

  constructor(code: string, sentence: string, fields: Readonly<Record<string, string>> = {}) {
    super(sentence)
    this.#code = code
    this.#fields = fields
  }

  details() {
    return {
      type: `about:blank#${this.#code}`,
      title: this.message,
      code: this.#code,
      ...(Object.keys(this.#fields).length === 0 ? {} : { fields: this.#fields }),
    }
  }
}
