import type { Relation } from './relation'
import type { Resource } from './resource'

const engagementClients = ['purchaser', 'engaged_engineer'] as const
const engagementPeople = [...engagementClients, 'assigned_consultant'] as const

/**
 * Who may do what: an action is allowed when the actor stands in one of the listed relations to the resource.
 * What is not listed is refused.
 */
export const policy = {
  'company.list': ['administrator'],
  'company.invite': ['administrator'],
  'company.inviteColleague': ['purchaser'],
  'company.read': ['purchaser', 'engineer', 'administrator'],
  'company.acceptTerms': ['pending_member', 'purchaser', 'engineer'],
  'person.list': ['administrator'],
  'person.inviteStaff': ['administrator'],
  'person.disable': ['administrator'],
  'person.endSessions': ['self'],
  'certificate.create': ['consultant'],

  'engagement.open': ['purchaser', 'engineer'],
  'engagement.read': engagementPeople,
  'engagement.readHeading': [...engagementPeople, 'administrator'],
  'engagement.addClient': ['purchaser'],
  'engagement.assign': ['administrator'],
  'scope.write': ['assigned_consultant'],
  'scope.decide': ['purchaser'],

  'evidence.add': engagementPeople,
  'evidence.read': engagementPeople,
  'evidence.stateFacts': engagementPeople,

  'method.read': ['signed_in'],
  'run.create': ['assigned_consultant'],
  'run.read': ['assigned_consultant'],
  'finding.write': ['assigned_consultant'],
  'finding.readDraft': ['assigned_consultant'],
  'finding.readPublished': engagementPeople,

  'time.track': ['assigned_consultant'],
  'time.readPosted': [...engagementPeople, 'administrator'],
  'hours.read': ['purchaser', 'engineer', 'administrator'],

  'report.compose': ['assigned_consultant'],
  'report.review': ['assigned_consultant'],
  'report.sign': ['assigned_consultant'],
  'report.readDraft': ['assigned_consultant'],
  'report.readReleased': engagementPeople,

  'offer.list': ['purchaser', 'engineer', 'administrator'],
  'purchase.start': ['purchaser'],
  'purchase.read': ['purchaser', 'administrator'],
  'books.read': ['administrator'],
} as const satisfies Record<string, readonly Relation[]>

export type Action = keyof typeof policy

/** Who may know that a resource exists at all; everybody else gets the answer for an unknown id. */
export const visibility: Record<Resource['kind'], readonly Relation[]> = {
  practice: ['signed_in'],
  person: ['self', 'administrator'],
  company: ['pending_member', 'purchaser', 'engineer', 'administrator'],
  engagement: [...engagementPeople, 'administrator'],
}
