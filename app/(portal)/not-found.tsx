import { NothingHere } from '@/components/shell/nothing-here'
import { PageBody } from '@/components/shell/page-body'

export default function NotFoundPage() {
  return (
    <PageBody>
      <title>Nothing here · Quellbench</title>
      <NothingHere />
    </PageBody>
  )
}
