import { z } from 'zod'

import { levelAtDistance } from '@/lib/core/limits/distance'
import { limitAt, standingWarning } from '@/lib/core/limits/limit-at'
import type { LimitDetector, LimitPort, LimitTable } from '@/lib/core/limits/limit-table'
import { limitTables } from '@/lib/core/limits/limit-tables'
import { err, ok, type Result } from '@/lib/core/result'

import type { Outputs, Topics } from '../topic'
import { topicOf } from '../topic-of'

const limitSchema = z.object({
  standard: z.string(),
  device_class: z.string().optional(),
  port: z.string().optional(),
  detector: z.string(),
  f: z.number().positive(),
  distance_m: z.number().positive().nullish(),
  measured: z.number().nullish(),
})

const extrapolationSchema = z.object({
  rule: z.enum(['20dB', '40dB']),
  level: z.number(),
  d_from: z.number().positive(),
  d_to: z.number().positive(),
  f: z.number().positive().nullish(),
})

const detectors: Readonly<Record<string, LimitDetector>> = { QP: 'quasi-peak', AV: 'average', PK: 'peak' }

export const limitsTopics: Topics = {
  'limits.conducted_mains': topicOf(limitSchema, (inputs) => limitOutputs(inputs, 'mains')),
  'limits.radiated': topicOf(limitSchema, (inputs) => limitOutputs(inputs, 'enclosure')),
  'limits.conducted_power': topicOf(limitSchema, (inputs) => limitOutputs(inputs, 'supply')),
  'limits.distance_extrapolation': topicOf(extrapolationSchema, ({ rule, level, d_from, d_to }) =>
    ok({ level: levelAtDistance(level, d_from, d_to, rule === '20dB' ? 20 : 40) }),
  ),
}

type LimitInputs = z.infer<typeof limitSchema>

const ports: Readonly<Record<LimitPort, string>> = {
  mains: 'conducted_mains',
  enclosure: 'radiated',
  supply: 'conducted_power',
}

function limitOutputs(inputs: LimitInputs, port: LimitPort): Result<Outputs, string> {
  if (inputs.port !== undefined && inputs.port !== ports[port]) {
    return err(`port: “${inputs.port}” has no place here`)
  }
  const table = tableOf(inputs, port)
  if (!table.ok) return table
  const limit = limitAt(table.value, inputs.f)
  if (!limit.ok) return err(`f: ${limit.error.message}`)
  const warning = standingWarning(table.value)
  return ok({
    limit: limit.value,
    unit: table.value.unit === 'dBµV' ? 'dbuv' : 'dbuv_per_m',
    ...(typeof inputs.measured === 'number' ? { margin_db: limit.value - inputs.measured } : {}),
    ...(warning === null ? {} : { warning }),
  })
}

function tableOf(inputs: LimitInputs, port: LimitPort): Result<LimitTable, string> {
  const detector = Object.hasOwn(detectors, inputs.detector) ? detectors[inputs.detector] : undefined
  if (detector === undefined) return err(`detector: there is no detector “${inputs.detector}”`)
  const { standard, deviceClass } = namedIn(inputs)
  const ofStandard = limitTables.filter((table) => table.standard === standard && table.port === port)
  if (ofStandard.length === 0) return err(`standard: no ${port} limits of “${inputs.standard}”`)
  const ofClass = ofStandard.filter((table) => table.deviceClass === deviceClass)
  if (ofClass.length === 0) return err(`device_class: ${standard} has no class “${inputs.device_class}”`)
  const ofDetector = ofClass.filter((table) => table.detector === detector)
  if (ofDetector.length === 0) return err(`detector: ${standard} has no ${detector} limits there`)
  const asked = port === 'enclosure' ? (inputs.distance_m ?? null) : null
  const atDistance = asked === null ? ofDetector : ofDetector.filter((table) => table.distance === asked)
  const [only, ...others] = atDistance
  if (only === undefined) return err(`distance_m: ${standard} has no limit at ${asked} m`)
  return others.length === 0 ? ok(only) : err('distance_m: this standard has limits at several distances')
}

const ruleNames: Readonly<Record<string, string>> = {
  'CISPR 32': 'CISPR 32',
  'EN 55032': 'CISPR 32',
  'CISPR 25': 'CISPR 25',
  'FCC 15.107': '47 CFR 15.107',
  'FCC 15.109': '47 CFR 15.109',
  'FCC 15.209': '47 CFR 15.209',
  '47 CFR 15.107': '47 CFR 15.107',
  '47 CFR 15.109': '47 CFR 15.109',
  '47 CFR 15.209': '47 CFR 15.209',
}

/** The military standard is named with its supply voltage: “MIL-STD-461G CE102 basic (28 V)”. */
function namedIn({ standard, device_class: deviceClass = '-' }: LimitInputs): {
  readonly standard: string
  readonly deviceClass: string
} {
  const known = Object.hasOwn(ruleNames, standard) ? ruleNames[standard] : undefined
  if (known !== undefined) return { standard: known, deviceClass: known.endsWith('209') ? '-' : deviceClass }
  const conducted = /^MIL-STD-461G CE102\b/u.test(standard)
  const [, volts = '28'] = /(\d+) ?V/u.exec(standard) ?? []
  if (conducted) return { standard: 'MIL-STD-461G CE102', deviceClass: `${volts} V` }
  if (/^MIL-STD-461G RE102\b/u.test(standard)) {
    return { standard: 'MIL-STD-461G RE102', deviceClass: 'ground, Navy mobile and Army' }
  }
  return { standard, deviceClass }
}
