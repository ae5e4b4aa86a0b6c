import { AssignmentSheet } from '@/components/engagements/assignment-sheet'
import { BriefSheet } from '@/components/engagements/brief-sheet'
import { PeopleSheet } from '@/components/engagements/people-sheet'
import { ScopeSheet } from '@/components/engagements/scope-sheet'
import { EvidenceSheet } from '@/components/evidence/evidence-sheet'
import { PageBody } from '@/components/shell/page-body'
import { Notice } from '@/components/ui/notice'
import { engagementPeople, engagements, evidence } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import * as steps from './actions'

export default async function EngagementPage({ params }: PageProps<'/engagements/[engagementId]'>) {
  const { engagementId } = await params
  const { may } = await query(engagements.getHeading, { engagementId })
  const assignment = may.assign ? <Assignment engagementId={engagementId} /> : null
  if (!may.read) {
    return (
      <PageBody>
        {assignment}
        <Notice>
          Brief, evidence and findings are open to those who work on the engagement: its people of the client
          and its assigned consultants.
        </Notice>
      </PageBody>
    )
  }
  const [engagement, files] = await Promise.all([
    query(engagements.getEngagement, { engagementId }),
    query(evidence.listEvidence, { engagementId }),
  ])
  const people = (
    <>
      <PeopleSheet
        engagementId={engagementId}
        clients={engagement.clients}
        consultants={engagement.consultants}
        addable={engagement.addableClients}
        steps={may.addClient ? { add: steps.addClient, remove: steps.removeClient } : undefined}
      />
      {assignment}
    </>
  )
  return (
    <PageBody aside={people}>
      <ScopeSheet
        engagementId={engagementId}
        scopes={engagement.scopes}
        writing={may.writeScope ? { save: steps.saveScope, propose: steps.proposeScope } : undefined}
        deciding={may.decideScope ? { approve: steps.approveScope, decline: steps.declineScope } : undefined}
      />
      <EvidenceSheet engagementId={engagementId} files={files} />
      <BriefSheet brief={engagement.brief} />
    </PageBody>
  )
}

const Assignment = async ({ engagementId }: { readonly engagementId: string }) => (
  <AssignmentSheet
    engagementId={engagementId}
    consultants={await query(engagementPeople.listConsultants, { engagementId })}
    assign={steps.assignConsultant}
    release={steps.releaseConsultant}
  />
)
