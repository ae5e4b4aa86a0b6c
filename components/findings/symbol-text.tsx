/** A symbol with its index set low: "C_par" becomes C with a small par. */
export const SymbolText = ({ symbol }: { readonly symbol: string }) => {
  const parts = symbol.split(/_([A-Za-z\d]+)/u)
  return (
    <span className="font-serif italic text-ink-soft">
      {parts.map((part, index) =>
        index % 2 === 1 ? (
          <sub key={index} className="not-italic">
            {part}
          </sub>
        ) : (
          part
        ),
      )}
    </span>
  )
}
