/** The line at the foot of every page, ruled into cells like the title block of a drawing. */
export const TitleBlock = ({ practiceName }: { readonly practiceName: string }) => (
  <footer className="mt-10 border-t border-rule-strong bg-sheet text-sm text-ink-soft">
    <div className="mx-auto flex max-w-page flex-wrap px-4 sm:px-6">
      <p className="py-2.5 pr-5">{practiceName}</p>
      <p className="border-rule py-2.5 sm:border-l sm:pl-5">
        Engineering estimates, not a statement of conformity
      </p>
    </div>
  </footer>
)
