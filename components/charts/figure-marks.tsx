import type { MarkLayout } from '@/lib/figure/layout'

/** Levels and instants as thin dashed lines, points as open circles. */
export const FigureMarks = ({ marks }: { readonly marks: readonly MarkLayout[] }) => (
  <g>
    {marks.map((mark) =>
      mark.kind === 'point' ? (
        <circle key={`${mark.x1} ${mark.y1}`} cx={mark.x1} cy={mark.y1} r={3.5} className="figure-point" />
      ) : (
        <line
          key={`${mark.kind} ${mark.x1} ${mark.y1}`}
          x1={mark.x1}
          y1={mark.y1}
          x2={mark.x2}
          y2={mark.y2}
          strokeDasharray="1.5 3"
          className="figure-mark"
        />
      ),
    )}
  </g>
)
