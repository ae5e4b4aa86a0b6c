import type { FindingActionDto } from '@/lib/domain/findings/finding-dto'

import { FindingText } from './finding-text'

/** The recommended actions in their order, with parts and side effects. */
export const NextSteps = ({ actions }: { readonly actions: readonly FindingActionDto[] }) =>
  actions.length === 0 ? (
    <p className="text-ink-soft">Nothing is recommended.</p>
  ) : (
    <ol className="flex flex-col divide-y divide-rule">
      {actions.map(({ instruction, partValues, sideEffects }, position) => (
        <li key={position} className="flex gap-3 py-3 first:pt-0 last:pb-0">
          <span className="num text-copper">{position + 1}</span>
          <div className="min-w-0">
            <FindingText>{instruction}</FindingText>
            <dl className="mt-1 grid gap-x-6 gap-y-1 text-sm sm:grid-cols-[auto_minmax(0,1fr)]">
              {partValues ? (
                <>
                  <dt className="text-ink-soft">Parts and values</dt>
                  <dd className="[overflow-wrap:anywhere]">{partValues}</dd>
                </>
              ) : null}
              {sideEffects ? (
                <>
                  <dt className="text-ink-soft">Side effects</dt>
                  <dd className="[overflow-wrap:anywhere]">{sideEffects}</dd>
                </>
              ) : null}
            </dl>
          </div>
        </li>
      ))}
    </ol>
  )
