import type { FigureLayout, PlacedLabel } from '@/lib/figure/layout'

import { PlacedText } from './placed-text'

type LabelProps = { readonly label: PlacedLabel | null; readonly className: string; readonly size: number }

const Label = ({ label, className, size }: LabelProps) =>
  label ? (
    <>
      <rect {...label.box} className="figure-label-ground" />
      <PlacedText text={label} className={className} size={size} />
    </>
  ) : null

/** Names written on their lines and beside their marks, last so that nothing is drawn over them. */
export const FigureLabels = ({ layout }: { readonly layout: FigureLayout }) => (
  <g>
    {layout.lines.map((line) => (
      <Label
        key={line.id}
        label={line.label}
        className={`figure-label-${line.role}`}
        size={layout.textSize}
      />
    ))}
    {layout.marks.map((mark) => (
      <Label
        key={`${mark.kind} ${mark.x1} ${mark.y1}`}
        label={mark.label}
        className="figure-label-mark"
        size={layout.textSize}
      />
    ))}
  </g>
)
