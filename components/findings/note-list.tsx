import { MathText } from './math-text'

/** Remarks on a method, one bullet each. */
export const NoteList = ({ notes }: { readonly notes: readonly string[] }) => (
  <ul className="flex max-w-measure list-disc flex-col gap-1 pl-5">
    {notes.map((note) => (
      <li key={note}>
        <MathText>{note}</MathText>
      </li>
    ))}
  </ul>
)
