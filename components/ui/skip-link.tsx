/** First thing a keyboard reaches: past the navigation, to the content. */
export const SkipLink = ({ target = 'main' }: { readonly target?: string | undefined }) => (
  <a
    href={`#${target}`}
    className="sr-only focus:not-sr-only focus:absolute focus:left-3 focus:top-3 focus:z-50 focus:rounded focus:border focus:border-copper focus:bg-sheet focus:px-4 focus:py-2 focus:text-ink"
  >
    Skip to the content
  </a>
)
