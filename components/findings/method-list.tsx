import { TextLink } from '../ui/text-link'

type MethodListProps = {
  readonly base: string
  readonly methods: readonly { readonly methodId: string; readonly title: string; readonly purpose: string }[]
}

export const MethodList = ({ base, methods }: MethodListProps) => (
  <ul className="grid gap-x-8 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
    {methods.map(({ methodId, title, purpose }) => (
      <li key={methodId}>
        <TextLink href={`${base}/${methodId}`} className="font-semibold">
          {title}
        </TextLink>
        <p className="max-w-measure text-sm text-ink-soft">{purpose}</p>
      </li>
    ))}
  </ul>
)
