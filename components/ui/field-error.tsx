/** The sentence under a field that was refused: what is wrong and what to do. */
export const FieldError = ({ id, children }: { readonly id: string; readonly children: string }) => (
  <p id={id} className="field-error flex gap-1.5 text-sm font-semibold text-over-limit">
    <svg viewBox="0 0 12 12" aria-hidden="true" className="mt-1 size-3.5 shrink-0 fill-current">
      <path d="M0 0H12V12H0ZM5 2.5V7H7V2.5ZM5 8.2V10H7V8.2Z" fillRule="evenodd" />
    </svg>
    <span>
      <span className="sr-only">Error: </span>
      {children}
    </span>
  </p>
)
