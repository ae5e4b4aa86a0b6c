/** What a person wrote, with their own line breaks. */
export const FindingText = ({ children }: { readonly children: string }) => (
  <p className="max-w-measure whitespace-pre-line [overflow-wrap:anywhere]">{children}</p>
)
