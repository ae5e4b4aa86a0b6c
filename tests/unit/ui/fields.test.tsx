import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'

import { CheckboxField } from '@/components/ui/checkbox-field'
import { QuantityField } from '@/components/ui/quantity-field'
import { SelectField } from '@/components/ui/select-field'
import { TextArea } from '@/components/ui/text-area'
import { TextField } from '@/components/ui/text-field'

const words = { name: 'vin', label: 'Input voltage', hint: 'At the input.', error: 'Write 48 or 48 V.' }

const idsIn = (markup: string) => new Set([...markup.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id))

describe.each([
  ['TextField', <TextField key="t" {...words} />],
  ['TextArea', <TextArea key="a" {...words} />],
  ['SelectField', <SelectField key="s" {...words} options={[{ value: 'a', label: 'A' }]} />],
  ['CheckboxField', <CheckboxField key="c" {...words} />],
  ['QuantityField', <QuantityField key="q" {...words} unit="V" />],
])('%s', (_, field) => {
  const markup = renderToStaticMarkup(field)

  it('is described only by elements that exist, its hint and its error among them', () => {
    const described = /aria-describedby="([^"]+)"/.exec(markup)?.[1]?.split(' ') ?? []
    expect(described).toEqual(expect.arrayContaining(['vin-hint', 'vin-error']))
    for (const id of described) expect(idsIn(markup)).toContain(id)
  })

  it('is named by its label, marked invalid, and free of inline styles', () => {
    expect(markup).toContain('for="vin"')
    expect(markup).toContain('aria-invalid="true"')
    expect(markup).not.toContain('style=')
  })
})

it('a field without hint or error is described by nothing', () => {
  expect(renderToStaticMarkup(<TextField name="a" label="A" />)).not.toContain('aria-')
})

it('a quantity says its unit to those who cannot see it', () => {
  expect(renderToStaticMarkup(<QuantityField name="c" label="Capacitance" unit="F" />)).toContain('in F')
})
