import { StatusMark } from '../ui/status-mark'

type Agreement = { readonly agrees: boolean; readonly sentence: string }

/** What must hold between two books, each with its mark. */
export const AgreementList = ({ agreements }: { readonly agreements: readonly Agreement[] }) => (
  <ul className="flex flex-col gap-0.5">
    {agreements.map((agreement) => (
      <li key={agreement.sentence}>
        <StatusMark kind={agreement.agrees ? 'verified' : 'over-limit'}>{agreement.sentence}</StatusMark>
      </li>
    ))}
  </ul>
)
