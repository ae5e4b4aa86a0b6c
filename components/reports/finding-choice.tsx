'use client'

import { useFieldError } from '../forms/form-state'
import { CheckboxField } from '../ui/checkbox-field'
import { FieldError } from '../ui/field-error'
import { FieldGroup } from '../ui/field-group'

export type OfferedFinding = { readonly findingId: string; readonly number: number; readonly claim: string }

type FindingChoiceProps = {
  readonly findings: readonly OfferedFinding[]
  readonly chosen: readonly string[]
}

/** The published findings of the engagement; the report holds those that are ticked. */
export const FindingChoice = ({ findings, chosen }: FindingChoiceProps) => {
  const error = useFieldError('findingIds')
  return (
    <FieldGroup legend="Findings" hint="Published findings of this engagement, in the order of the report.">
      <div id="findingIds" tabIndex={-1} className="flex flex-col gap-2">
        {findings.map((finding) => (
          <CheckboxField
            key={finding.findingId}
            id={`finding-${finding.findingId}`}
            name="findingIds[]"
            value={finding.findingId}
            defaultChecked={chosen.includes(finding.findingId)}
            label={`${finding.number}. ${finding.claim}`}
          />
        ))}
        {error ? <FieldError id="findingIds-error">{error}</FieldError> : null}
      </div>
    </FieldGroup>
  )
}
