import { TextLink } from '../ui/text-link'

/** The one answer for an unknown address and for one that the reader may not know of. */
export const NothingHere = () => (
  <div className="max-w-measure">
    <h1 className="text-2xl">Nothing is here</h1>
    <p className="my-4">
      The address may be mistyped, what stood here may have been removed, or you may not be on it. If you
      expect to see it, ask the purchaser of your company or the practice.
    </p>
    <TextLink href="/">To your first page</TextLink>
  </div>
)
