import { MathText } from './math-text'

/** Formulas one below the other, in the face of numbers; a long one wraps. */
export const FormulaList = ({ formulas }: { readonly formulas: readonly string[] }) => (
  <ul className="flex flex-col gap-1.5">
    {formulas.map((formula) => (
      <li key={formula} className="num whitespace-pre-wrap text-sm [overflow-wrap:anywhere]">
        <MathText>{formula}</MathText>
      </li>
    ))}
  </ul>
)
