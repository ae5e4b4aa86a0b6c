import type { Figure } from '@/lib/core/figure/figure'
import { layoutFigure } from '@/lib/figure/layout-figure'

import { FigureDrawing } from './figure-drawing'
import { FigureKey } from './figure-key'
import { FigureValues } from './figure-values'

type FigureSvgProps = {
  readonly figure: Figure
  /** Written before the title, e.g. "Figure 3". */
  readonly number?: string | undefined
}

/** Two layouts of the same figure, so that the type stays readable on a phone; the screen's width shows one. */
const wideSize = { width: 760, height: 400, textSize: 13 }
const narrowSize = { width: 330, height: 300, textSize: 13 }

/** A figure on the page: drawing, caption and a table of its values. */
export const FigureSvg = ({ figure, number }: FigureSvgProps) => {
  const wide = layoutFigure(figure, wideSize)
  const narrow = layoutFigure(figure, narrowSize)
  const words = { title: figure.title, description: figure.description }
  return (
    <figure className="flex min-w-0 flex-col gap-2">
      <FigureDrawing layout={wide} id={`${figure.id}-wide`} {...words} className="hidden w-full sm:block" />
      <FigureDrawing layout={narrow} id={`${figure.id}-narrow`} {...words} className="w-full sm:hidden" />
      <FigureKey entries={wide.key} className="hidden sm:flex" />
      <FigureKey entries={narrow.key} className="flex sm:hidden" />
      <figcaption className="text-sm">
        {number ? <span className="font-semibold">{`${number}. `}</span> : null}
        <span className="font-semibold">{figure.title}.</span>{' '}
        <span className="text-ink-soft">{figure.description}</span>
      </figcaption>
      <FigureValues figure={figure} />
    </figure>
  )
}
