import type { FigureLayout, LineLayout } from '@/lib/figure/layout'
import { lineStyle } from '@/lib/figure/line-style'

import { FigureGrid } from './figure-grid'
import { FigureLabels } from './figure-labels'
import { FigureMarks } from './figure-marks'

const Line = ({ line }: { readonly line: LineLayout }) => {
  const style = lineStyle(line.role, line.rank)
  return (
    <path
      d={line.path}
      strokeWidth={style.width}
      strokeDasharray={style.dash.join(' ') || undefined}
      className={`figure-line figure-${line.role}`}
    />
  )
}

type FigureDrawingProps = {
  readonly layout: FigureLayout
  readonly id: string
  readonly title: string
  readonly description: string
  readonly className?: string | undefined
}

/** One layout as SVG. Colours come from classes by role, so that both themes and the print apply. */
export const FigureDrawing = ({ layout, id, title, description, className }: FigureDrawingProps) => (
  <svg
    viewBox={`0 0 ${layout.width} ${layout.height}`}
    role="img"
    aria-labelledby={`${id}-title ${id}-description`}
    className={className}
  >
    <title id={`${id}-title`}>{title}</title>
    <desc id={`${id}-description`}>{description}</desc>
    <FigureGrid layout={layout} />
    {layout.lines.map((line) => (line.path ? <Line key={line.id} line={line} /> : null))}
    <FigureMarks marks={layout.marks} />
    <FigureLabels layout={layout} />
  </svg>
)
