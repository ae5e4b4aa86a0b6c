import { PublicShell } from '@/components/shell/public-shell'
import { TextLink } from '@/components/ui/text-link'
import { practiceName } from '@/lib/server/practice'

export const metadata = { title: 'Nothing here' }

export default function NotFoundPage() {
  return (
    <PublicShell practiceName={practiceName()}>
      <h1 className="text-2xl">Nothing is here</h1>
      <p className="my-4 max-w-measure">
        The address may be mistyped, what stood here may have been removed, or you may not be on it. If you
        expect to see it, ask the purchaser of your company or the practice.
      </p>
      <TextLink href="/">To your first page</TextLink>
    </PublicShell>
  )
}
