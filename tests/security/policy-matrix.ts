import type { Action } from '@/lib/authz/policy'

/** The people of the matrix, as they stand to one company with one engagement. */
export const personas = [
  'purchaser',
  'engineer on it',
  'engineer not on it',
  'member before the terms',
  'consultant on it',
  'consultant not on it',
  'administrator',
  'purchaser of another company',
] as const

export type Persona = (typeof personas)[number]

type Row = {
  readonly about: 'practice' | 'company' | 'engagement' | 'oneself'
  readonly may: readonly Persona[]
}

const everybody = personas
const clients: readonly Persona[] = ['purchaser', 'engineer on it']
const people: readonly Persona[] = [...clients, 'consultant on it']
const members: readonly Persona[] = ['purchaser', 'engineer on it', 'engineer not on it']

/** Action by action, who may: written from the roles of the practice, not from the policy's code. */
export const policyMatrix: Readonly<Record<Action, Row>> = {
  'company.list': { about: 'practice', may: ['administrator'] },
  'company.invite': { about: 'practice', may: ['administrator'] },
  'company.inviteColleague': { about: 'company', may: ['purchaser'] },
  'company.read': { about: 'company', may: [...members, 'administrator'] },
  'company.acceptTerms': { about: 'company', may: [...members, 'member before the terms'] },
  'person.list': { about: 'practice', may: ['administrator'] },
  'person.inviteStaff': { about: 'practice', may: ['administrator'] },
  'person.disable': { about: 'oneself', may: ['administrator'] },
  'person.endSessions': { about: 'oneself', may: everybody },
  'certificate.create': { about: 'practice', may: ['consultant on it', 'consultant not on it'] },
  'engagement.open': { about: 'company', may: members },
  'engagement.read': { about: 'engagement', may: people },
  'engagement.readHeading': { about: 'engagement', may: [...people, 'administrator'] },
  'engagement.addClient': { about: 'engagement', may: ['purchaser'] },
  'engagement.assign': { about: 'engagement', may: ['administrator'] },
  'scope.write': { about: 'engagement', may: ['consultant on it'] },
  'scope.decide': { about: 'engagement', may: ['purchaser'] },
  'evidence.add': { about: 'engagement', may: people },
  'evidence.read': { about: 'engagement', may: people },
  'evidence.stateFacts': { about: 'engagement', may: people },
  'method.read': { about: 'practice', may: everybody },
  'run.create': { about: 'engagement', may: ['consultant on it'] },
  'run.read': { about: 'engagement', may: ['consultant on it'] },
  'finding.write': { about: 'engagement', may: ['consultant on it'] },
  'finding.readDraft': { about: 'engagement', may: ['consultant on it'] },
  'finding.readPublished': { about: 'engagement', may: people },
  'time.track': { about: 'engagement', may: ['consultant on it'] },
  'time.readPosted': { about: 'engagement', may: [...people, 'administrator'] },
  'hours.read': { about: 'company', may: [...members, 'administrator'] },
  'report.compose': { about: 'engagement', may: ['consultant on it'] },
  'report.review': { about: 'engagement', may: ['consultant on it'] },
  'report.sign': { about: 'engagement', may: ['consultant on it'] },
  'report.readDraft': { about: 'engagement', may: ['consultant on it'] },
  'report.readReleased': { about: 'engagement', may: people },
  'offer.list': { about: 'company', may: [...members, 'administrator'] },
  'purchase.start': { about: 'company', may: ['purchaser'] },
  'purchase.read': { about: 'company', may: ['purchaser', 'administrator'] },
  'books.read': { about: 'practice', may: ['administrator'] },
}
