/** A letter, then an index: what "C_par" is written with in plain text. File names hold longer words before the mark. */
const index = /(?<=(?<![A-Za-z\d])\p{L})_([A-Za-z\d]+)/u

/** Text with the indices of its symbols set low: "C_par" becomes C with a small par. */
export const MathText = ({ children }: { readonly children: string }) =>
  children
    .split(index)
    .map((part, position) => (position % 2 === 1 ? <sub key={position}>{part}</sub> : part))

/** A symbol on its own, in the slanted face of handbooks. */
export const SymbolText = ({ symbol }: { readonly symbol: string }) => (
  <span className="font-serif italic text-ink-soft [&_sub]:not-italic">
    <MathText>{symbol}</MathText>
  </span>
)
