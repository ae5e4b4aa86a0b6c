import { G, Line, Path, Rect, Svg, Text, View } from '@react-pdf/renderer'

import type { Figure, SeriesRole } from '@/lib/core/figure/figure'
import type { FigureLayout, PlacedLabel, PlacedText } from '@/lib/figure/layout'
import { layoutFigure } from '@/lib/figure/layout-figure'
import { lineStyle } from '@/lib/figure/line-style'

import { families } from '../fonts'
import { colours, styles } from '../styles'

const size = { width: 483, height: 236, textSize: 8 }

const roleColours: Record<SeriesRole | 'mark' | 'point', string> = {
  measured: colours.ink,
  computed: colours.copper,
  reference: colours.inkFaint,
  limit: colours.overLimit,
  mark: colours.inkSoft,
  point: colours.copper,
}

type Face = { readonly family: string; readonly colour: string; readonly weight?: 400 | 600 }

const Written = ({ placed, face }: { readonly placed: PlacedText; readonly face: Face }) => (
  <Text
    x={placed.x}
    y={placed.y}
    textAnchor={placed.anchor}
    fill={face.colour}
    {...(placed.rotation === 0 ? {} : { transform: `rotate(${placed.rotation}, ${placed.x}, ${placed.y})` })}
    style={{ fontFamily: face.family, fontSize: size.textSize, fontWeight: face.weight ?? 400 }}
  >
    {placed.text}
  </Text>
)

const LabelOnGround = ({ label, colour }: { readonly label: PlacedLabel; readonly colour: string }) => (
  <G>
    <Rect {...label.box} fill={colours.paper} fillOpacity={0.85} />
    <Written placed={label} face={{ family: families.text, colour, weight: 600 }} />
  </G>
)

const Grid = ({ layout }: { readonly layout: FigureLayout }) => {
  const { plot } = layout
  const look = (weight: 'major' | 'minor') => ({
    stroke: colours.rule,
    strokeWidth: weight === 'major' ? 0.6 : 0.3,
  })
  return (
    <G>
      {layout.x.grid.map(({ position, weight }) => (
        <Line
          key={`x${position}`}
          x1={position}
          x2={position}
          y1={plot.y}
          y2={plot.y + plot.height}
          {...look(weight)}
        />
      ))}
      {layout.y.grid.map(({ position, weight }) => (
        <Line
          key={`y${position}`}
          x1={plot.x}
          x2={plot.x + plot.width}
          y1={position}
          y2={position}
          {...look(weight)}
        />
      ))}
      <Rect {...plot} fill="none" stroke={colours.inkSoft} strokeWidth={0.75} />
    </G>
  )
}

const Axes = ({ layout }: { readonly layout: FigureLayout }) => {
  const tick = { family: families.number, colour: colours.inkSoft }
  const title = { family: families.text, colour: colours.ink, weight: 600 as const }
  return (
    <G>
      {[...layout.x.ticks, ...layout.y.ticks].map((placed, index) => (
        <Written key={index} placed={placed} face={tick} />
      ))}
      <Written placed={layout.x.title} face={title} />
      <Written placed={layout.y.title} face={title} />
    </G>
  )
}

const Lines = ({ layout }: { readonly layout: FigureLayout }) => (
  <G>
    {layout.marks.map((mark, index) => (
      <Line
        key={`mark${index}`}
        x1={mark.x1}
        y1={mark.y1}
        x2={mark.x2}
        y2={mark.y2}
        stroke={colours.inkSoft}
        strokeWidth={0.6}
      />
    ))}
    {layout.lines
      .filter((line) => line.path !== '')
      .map((line) => {
        const { width, dash } = lineStyle(line.role, line.rank)
        return (
          <Path
            key={line.id}
            d={line.path}
            fill="none"
            stroke={roleColours[line.role]}
            strokeWidth={width * 0.7}
            {...(dash.length > 0 ? { strokeDasharray: dash.join(' ') } : {})}
          />
        )
      })}
    {layout.marks.map((mark, index) =>
      mark.label ? <LabelOnGround key={`label${index}`} label={mark.label} colour={colours.inkSoft} /> : null,
    )}
    {layout.lines.map((line) =>
      line.label ? (
        <LabelOnGround key={`name${line.id}`} label={line.label} colour={roleColours[line.role]} />
      ) : null,
    )}
  </G>
)

/** A figure of the report, as vectors, with its caption; never torn apart by a page break. */
export const ReportFigure = ({ figure, number }: { readonly figure: Figure; readonly number: string }) => {
  const layout = layoutFigure(figure, size)
  return (
    <View wrap={false} style={{ marginVertical: 6 }}>
      <Svg width={size.width} height={size.height} viewBox={`0 0 ${size.width} ${size.height}`}>
        <Grid layout={layout} />
        <Lines layout={layout} />
        <Axes layout={layout} />
      </Svg>
      {layout.key.map((entry) => (
        <Text key={entry.text} style={{ ...styles.small, color: roleColours[entry.role] }}>
          {entry.text}
        </Text>
      ))}
      <Text style={styles.small}>
        <Text style={styles.strong}>Figure {number}. </Text>
        <Text style={styles.strong}>{figure.title}. </Text>
        <Text style={styles.soft}>{figure.description}</Text>
      </Text>
    </View>
  )
}
