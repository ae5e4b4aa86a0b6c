/** The only source of randomness outside cryptographic modules. */
export type Ids = {
  /** A new identifier of 26 lower-case base-32 characters (128 random bits). */
  readonly newId: () => string
  /** A secret for links and sessions: 256 random bits, base64url. */
  readonly newSecret: () => string
}
