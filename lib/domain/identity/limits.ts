const minute = 60_000
const hour = 60 * minute

/** How long proofs of identity last and how often they may be asked for. Written down in DEVELOPERS.md. */
export const identityLimits = {
  sessionIdle: 2 * hour,
  sessionAbsolute: 12 * hour,
  invitation: 7 * 24 * hour,
  oneTimeLink: 10 * minute,
  throttleWindow: 15 * minute,
  failedSignInsPerAccount: 5,
  failedSignInsPerAddress: 50,
  linksPerAccount: 3,
  linksPerAddress: 15,
  passwordLength: 12,
} as const
