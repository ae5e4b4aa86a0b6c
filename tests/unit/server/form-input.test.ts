import { describe, expect, it } from 'vitest'

import { formInput } from '@/lib/server/form-input'

function form(...entries: readonly (readonly [string, string])[]): FormData {
  const data = new FormData()
  for (const [name, value] of entries) data.append(name, value)
  return data
}

describe('form input', () => {
  it('nests dotted names and makes lists of numbered ones', () => {
    const input = formInput(
      form(['title', 'Ring'], ['oscillators.0.name', 'buck'], ['oscillators.1.name', 'clock']),
    )
    expect(input).toEqual({ title: 'Ring', oscillators: [{ name: 'buck' }, { name: 'clock' }] })
  })

  it('keeps a repeated field as a list, and a single one when the name asks for a list', () => {
    expect(formInput(form(['runs', 'a'], ['runs', 'b']))).toEqual({ runs: ['a', 'b'] })
    expect(formInput(form(['runs[]', 'a']))).toEqual({ runs: ['a'] })
  })

  it('leaves out what the framework adds and keeps what a stranger adds, for the schema to refuse', () => {
    expect(formInput(form(['$ACTION_ID_1', ''], ['role', 'administrator']))).toEqual({
      role: 'administrator',
    })
  })

  it('cannot reach the prototype of anything', () => {
    formInput(form(['__proto__.isAdministrator', '1'], ['constructor.prototype.isAdministrator', '1']))
    expect({}).not.toHaveProperty('isAdministrator')
  })
})
