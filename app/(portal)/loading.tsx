import { PageBody } from '@/components/shell/page-body'
import { Skeleton } from '@/components/ui/skeleton'

export default function Loading() {
  return (
    <PageBody>
      <Skeleton label="Loading the page" lines={6} />
    </PageBody>
  )
}
