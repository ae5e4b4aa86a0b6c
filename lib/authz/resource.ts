/** What an action is about: just the facts of the loaded row that the policy needs. */
export type Resource =
  | { readonly kind: 'practice' }
  | { readonly kind: 'person'; readonly personId: string }
  | { readonly kind: 'company'; readonly companyId: string }
  | EngagementResource

export type EngagementResource = {
  readonly kind: 'engagement'
  readonly companyId: string
  readonly clientPersonIds: readonly string[]
  readonly consultantPersonIds: readonly string[]
}

export const practice: Resource = { kind: 'practice' }
