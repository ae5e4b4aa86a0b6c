import type { FigureLayout, GridLine } from '@/lib/figure/layout'

import { PlacedText } from './placed-text'

const gridClass = (line: GridLine) => (line.weight === 'major' ? 'figure-grid-major' : 'figure-grid-minor')

/** The frame, the grid behind the lines, and the words of both axes. */
export const FigureGrid = ({ layout }: { readonly layout: FigureLayout }) => {
  const { plot, x, y, textSize } = layout
  return (
    <g>
      {x.grid.map((line) => (
        <line
          key={`x${line.position}`}
          x1={line.position}
          x2={line.position}
          y1={plot.y}
          y2={plot.y + plot.height}
          className={gridClass(line)}
        />
      ))}
      {y.grid.map((line) => (
        <line
          key={`y${line.position}`}
          x1={plot.x}
          x2={plot.x + plot.width}
          y1={line.position}
          y2={line.position}
          className={gridClass(line)}
        />
      ))}
      <rect {...plot} className="figure-frame" />
      {[...x.ticks, ...y.ticks].map((tick) => (
        <PlacedText key={`${tick.x} ${tick.y}`} text={tick} className="figure-tick" size={textSize * 0.94} />
      ))}
      <PlacedText text={x.title} className="figure-title" size={textSize} />
      <PlacedText text={y.title} className="figure-title" size={textSize} />
    </g>
  )
}
