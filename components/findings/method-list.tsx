import { TextLink } from '../ui/text-link'

type MethodListProps = {
  readonly base: string
  readonly methods: readonly { readonly methodId: string; readonly title: string; readonly purpose: string }[]
}

export const MethodList = ({ base, methods }: MethodListProps) => (
  <ul className="flex flex-col divide-y divide-rule">
    {methods.map(({ methodId, title, purpose }) => (
      <li key={methodId} className="py-2.5 first:pt-0 last:pb-0">
        <TextLink href={`${base}/${methodId}`} className="font-semibold">
          {title}
        </TextLink>
        <p className="max-w-measure text-sm text-ink-soft">{purpose}</p>
      </li>
    ))}
  </ul>
)
