/** One-way storage of passwords. */
export type PasswordHasher = {
  readonly hash: (password: string) => Promise<string>
  /** Takes as long for an unknown account (no stored hash) as for a known one. */
  readonly verify: (storedHash: string | null, password: string) => Promise<boolean>
}
