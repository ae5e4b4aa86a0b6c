import type { PlacedText as Text } from '@/lib/figure/layout'

type PlacedTextProps = { readonly text: Text; readonly className: string; readonly size: number }

export const PlacedText = ({ text, className, size }: PlacedTextProps) => (
  <text
    x={text.x}
    y={text.y}
    textAnchor={text.anchor}
    fontSize={size}
    className={className}
    transform={text.rotation === 0 ? undefined : `rotate(${text.rotation} ${text.x} ${text.y})`}
  >
    {text.text}
  </text>
)
