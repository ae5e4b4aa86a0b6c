/** A signed-in person with everything that decides what they may do, read afresh for every request. */
export type Actor = {
  readonly personId: string
  readonly name: string
  readonly email: string
  readonly isConsultant: boolean
  readonly isAdministrator: boolean
  readonly memberships: readonly CompanyMembership[]
}

export type CompanyMembership = {
  readonly companyId: string
  readonly companyName: string
  readonly role: 'purchaser' | 'engineer'
  /** Whether the current confidentiality terms were accepted; until then the membership allows nothing else. */
  readonly hasAcceptedTerms: boolean
}
