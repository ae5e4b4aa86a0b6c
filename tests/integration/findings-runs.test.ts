import { createHash } from 'node:crypto'
import { writeFileSync } from 'node:fs'

import Sqlite from 'better-sqlite3'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { measureRing, listTraces } from '@/lib/domain/findings/measure.service'
import { recomputeRun } from '@/lib/domain/findings/recompute.service'
import { listRuns, runMethod } from '@/lib/domain/findings/run.service'

import { captureBytes, describedCapture, truthOf } from '../reference/reference-captures'
import { openTestEngagement, type TestEngagement } from '../support/engagement'
import {
  measureCapture,
  readRun,
  resultOf,
  runParasitics,
  sendReferenceCapture,
  stateGoodFacts,
} from '../support/findings'
import { bytesOf } from '../support/sample-files'
import { openTestPortal, type TestPortal } from '../support/test-portal'
import { valueOf } from '../support/value-of'

let portal: TestPortal
let osterby: TestEngagement

beforeEach(async () => {
  portal = await openTestPortal()
  osterby = await openTestEngagement(portal)
})

afterEach(() => portal.close())

const sha256Of = (file: string) => createHash('sha256').update(captureBytes(file)).digest('hex')
const off = (value: number, truth: number) => Math.abs(value / truth - 1)
const run = (inputs: Record<string, unknown>, methodId = 'ring-parasitics') =>
  runMethod.execute(portal.deps, osterby.consultant, { engagementId: osterby.engagementId, methodId, inputs })
const recompute = async (runId: string) =>
  valueOf(await recomputeRun.execute(portal.deps, osterby.consultant, { runId }))

describe('from two captures to the parasitics of the circuit that made them', () => {
  it('ends within the tolerance of the truths: 300 pF and 8 nH from ngspice’s waveforms', async () => {
    const { bareRunId, loadedRunId, runId } = await runParasitics(portal, osterby)
    const bare = await readRun(portal, osterby.consultant, bareRunId)
    const { tolerance, ...truths } = describedCapture('o01_bare.csv')
    const truth = truthOf({ tolerance, ...truths })
    expect(off(resultOf(bare, 'dampedFrequency'), truth.ring_frequency ?? 0)).toBeLessThan(
      tolerance.ring_frequency_rel,
    )
    const parasitics = await readRun(portal, osterby.consultant, runId)
    // A relative frequency error e of either ring grows to 2q/(q − 1) · 2e in C_par and as much, less 2e, in L_par.
    const growth = resultOf(parasitics, 'errorGrowth') * 2 * tolerance.ring_frequency_rel
    expect(off(resultOf(parasitics, 'cPar'), 300e-12)).toBeLessThan(growth)
    expect(off(resultOf(parasitics, 'lPar'), 8e-9)).toBeLessThan(growth)
    // What is reached is far better than what the tolerance of the truths would allow.
    expect(off(resultOf(parasitics, 'cPar'), 300e-12)).toBeLessThan(0.005)
    expect(off(resultOf(parasitics, 'lPar'), 8e-9)).toBeLessThan(0.005)
    expect((await readRun(portal, osterby.consultant, loadedRunId)).number).toBe(2)
  })

  it('tells of every input where it comes from, and inherits the hashes of both captures', async () => {
    const { runId, bareRunId, bareId, loadedId } = await runParasitics(portal, osterby)
    const parasitics = await readRun(portal, osterby.consultant, runId)
    expect(parasitics.evidence).toEqual([
      { evidenceId: bareId, number: 1, name: 'o01_bare.csv', sha256: sha256Of('o01_bare.csv') },
      {
        evidenceId: loadedId,
        number: 2,
        name: 'o02_with_cadd_470pF.csv',
        sha256: sha256Of('o02_with_cadd_470pF.csv'),
      },
    ])
    const input = (key: string) => parasitics.inputs.find((candidate) => candidate.key === key)
    expect(input('f0')).toMatchObject({
      origin: 'Ring frequency f_d of run 1, Ring of o01_bare.csv, SW',
      fromRunId: bareRunId,
    })
    expect(input('cAdd')).toMatchObject({
      origin: `Typed by ${osterby.consultant.name} as “470p”, that is 470\u00a0pF`,
      fromRunId: null,
      value: 470e-12,
    })
  })

  it('carries on into the snubber with results of the run before, tolerances and their intervals', async () => {
    const { runId } = await runParasitics(portal, osterby)
    const sized = await run(
      {
        lPar: { pick: `${runId}:lPar`, tolerance: '5 %' },
        cPar: { pick: `${runId}:cPar`, tolerance: '5 %' },
        vStep: { text: '12' },
        fSw: { text: '420k' },
      },
      'rc-snubber',
    )
    const snubber = await readRun(portal, osterby.consultant, valueOf(sized).runId)
    expect(snubber.evidence).toHaveLength(2)
    const overshoot = snubber.results.find(({ key }) => key === 'overshootAfter')
    expect(overshoot?.interval?.low).toBeLessThan(overshoot?.value ?? 0)
    expect(overshoot?.interval?.high).toBeGreaterThan(overshoot?.value ?? 0)
    expect((await recompute(snubber.runId)).isSame).toBe(true)
  })
})

describe('a value that is picked', () => {
  it('is read from the stored run, whatever the form says beside it', async () => {
    const { bareRunId, loadedRunId } = await runParasitics(portal, osterby)
    const made = await run({
      f0: { pick: `${bareRunId}:dampedFrequency`, text: '999 MHz' },
      f1: { pick: `${loadedRunId}:dampedFrequency`, text: '1 Hz' },
      cAdd: { text: '470p', pick: '' },
    })
    const forged = await readRun(portal, osterby.consultant, valueOf(made).runId)
    const bare = await readRun(portal, osterby.consultant, bareRunId)
    expect(forged.inputs.find(({ key }) => key === 'f0')?.value).toBe(resultOf(bare, 'dampedFrequency'))
  })

  it('cannot bring a value of its own along', async () => {
    const { bareRunId } = await runParasitics(portal, osterby)
    const sneaked = { fromRun: bareRunId, key: 'dampedFrequency', value: 1 }
    expect(await run({ f0: sneaked, f1: { text: '64M' }, cAdd: { text: '470p' } })).toMatchObject({
      error: { code: 'invalid_input' },
    })
  })

  it('of another engagement is refused exactly as one that does not exist', async () => {
    const larkfield = await openTestEngagement(portal, 'Larkfield Rail Sensors')
    const foreign = await runParasitics(portal, larkfield)
    const take = (fromRun: string) =>
      run({ f0: { fromRun, key: 'dampedFrequency' }, f1: { text: '64M' }, cAdd: { text: '470p' } })
    const answer = await take(foreign.bareRunId)
    expect(answer).toEqual(await take(portal.deps.ids.newId()))
    expect(answer).toMatchObject({ error: { fields: { 'inputs.f0.pick': expect.any(String) } } })
  })

  it('of another quantity or without a result of that name is refused at its list', async () => {
    const { bareRunId } = await runParasitics(portal, osterby)
    const take = (key: string) =>
      run({ f0: { fromRun: bareRunId, key }, f1: { text: '64M' }, cAdd: { text: '470p' } })
    for (const key of ['overshoot', 'nothing']) {
      expect(await take(key)).toMatchObject({ error: { fields: { 'inputs.f0.pick': expect.any(String) } } })
    }
  })
})

describe('a refused run', () => {
  it('names each field with a sentence, and nothing is stored', async () => {
    expect(
      await run({ f0: { text: '60M' }, f1: { text: '64M', tolerance: 'wide' }, cAdd: { text: '470p' } }),
    ).toMatchObject({
      error: { fields: { 'inputs.f1.text': expect.stringContaining('below the bare one') } },
    })
    expect(await run({ f0: { text: '100M' }, f1: { text: 'x' } })).toMatchObject({
      error: {
        fields: {
          'inputs.f1.text': expect.any(String),
          'inputs.cAdd.text': expect.stringContaining('needed'),
        },
      },
    })
    const wide = { f0: { text: '100M' }, f1: { text: '64M', tolerance: 'wide' }, cAdd: { text: '470p' } }
    expect(await run(wide)).toMatchObject({
      error: { fields: { 'inputs.f1.tolerance': expect.stringContaining('not a tolerance') } },
    })
    expect(await run({}, 'no-such-method')).toMatchObject({ error: { code: 'no_such_method' } })
    const listed = await listRuns.execute(portal.deps, osterby.consultant, {
      engagementId: osterby.engagementId,
    })
    expect(valueOf(listed)).toEqual([])
  })
})

describe('measuring a capture', () => {
  it('says in the checks what the missing facts rule out, and passes them once they are stated', async () => {
    const evidenceId = await sendReferenceCapture(portal, osterby, 'o01_bare.csv')
    const unstated = await readRun(
      portal,
      osterby.consultant,
      await measureCapture(portal, osterby, evidenceId),
    )
    const failed = unstated.validity.filter(({ passed }) => !passed).map(({ sentence }) => sentence)
    expect(failed).toEqual([
      expect.stringMatching(/is above 20.0\u00a0MHz/u),
      expect.stringMatching(/Bandwidth not stated/u),
      expect.stringMatching(/Ground method not stated/u),
      expect.stringMatching(/Probe capacitance not stated/u),
    ])
    expect(unstated.warnings.join(' ')).toMatch(/Probing point not stated/u)
    await stateGoodFacts(portal, osterby, evidenceId)
    const stated = await readRun(
      portal,
      osterby.consultant,
      await measureCapture(portal, osterby, evidenceId),
    )
    expect(stated.validity.filter(({ passed }) => !passed)).toEqual([])
    expect(stated.warnings).toEqual([])
    expect(stated.figures).toHaveLength(1)
  })

  it('keeps "no ring" as an answer with the numbers of the edge', async () => {
    const evidenceId = await sendReferenceCapture(portal, osterby, 'o03_snubbed.csv')
    const measured = await readRun(
      portal,
      osterby.consultant,
      await measureCapture(portal, osterby, evidenceId),
    )
    expect(measured.absence).toMatch(/above the noise/u)
    expect(measured.results.map(({ key }) => key)).not.toContain('dampedFrequency')
    expect(resultOf(measured, 'transitionTime')).toBeGreaterThan(0)
  })

  it('looks at the window alone, written in engineering notation', async () => {
    const evidenceId = await sendReferenceCapture(portal, osterby, 'o01_bare.csv')
    const runId = await measureCapture(portal, osterby, evidenceId, { from: '-50n', to: '300 ns' })
    const windowed = await readRun(portal, osterby.consultant, runId)
    expect(windowed.inputs.map(({ key, value }) => [key, value])).toEqual([
      ['from', -50e-9],
      ['to', 300e-9],
    ])
    const truth = truthOf(describedCapture('o01_bare.csv'))
    expect(off(resultOf(windowed, 'dampedFrequency'), truth.ring_frequency ?? 0)).toBeLessThan(0.01)
    expect((await recompute(runId)).isSame).toBe(true)
  })

  it('refuses a window without an edge, a reversed one, a missing channel and a file that is no capture', async () => {
    const evidenceId = await sendReferenceCapture(portal, osterby, 'o01_bare.csv')
    const measure = (input: Record<string, string>) =>
      measureRing.execute(portal.deps, osterby.consultant, { evidenceId, channel: '0', ...input })
    expect(await measure({ to: '-200n' })).toMatchObject({
      error: { code: 'nothing_to_measure', fields: { from: expect.stringContaining('no edge') } },
    })
    expect(await measure({ from: '1u', to: '0' })).toMatchObject({ error: { code: 'window_reversed' } })
    expect(await measure({ from: 'soon' })).toMatchObject({ error: { fields: { from: expect.any(String) } } })
    expect(await measure({ channel: '7' })).toMatchObject({ error: { code: 'no_such_channel' } })
  })

  it('offers the channels of every capture that was read', async () => {
    await sendReferenceCapture(portal, osterby, 'o05_four_channels.csv')
    const traces = await listTraces.execute(portal.deps, osterby.consultant, {
      engagementId: osterby.engagementId,
    })
    expect(valueOf(traces)[0]?.channels.map(({ name }) => name)).toContain('SW')
  })
})

describe('a stored run', () => {
  it('is never edited and never deleted', async () => {
    const { runId } = await runParasitics(portal, osterby)
    const change = portal.db.updateTable('method_run').set({ result: '{}' }).where('id', '=', runId).execute()
    await expect(change).rejects.toThrow('a run is never edited')
    const removal = portal.db.deleteFrom('method_run').where('id', '=', runId).execute()
    await expect(removal).rejects.toThrow('a run is never deleted')
    const evidence = portal.db
      .updateTable('method_run_evidence')
      .set({ sha256: 'f'.repeat(64) })
      .execute()
    await expect(evidence).rejects.toThrow('never edited')
  })

  it('repeats to the last digit, down to the bytes of the captures', async () => {
    const { runId, bareRunId } = await runParasitics(portal, osterby)
    expect(await recompute(runId)).toMatchObject({ isSame: true })
    expect(await recompute(bareRunId)).toMatchObject({ isSame: true })
  })

  /** What somebody with the database file in their hands could do: take the guard away and change one last digit. */
  async function plantDigit(runId: string, column: 'result' | 'inputs', before: string) {
    const row = await portal.db
      .selectFrom('method_run')
      .select(column)
      .where('id', '=', runId)
      .executeTakeFirstOrThrow()
    const text = row[column] ?? ''
    const start = text.indexOf('"value":', text.indexOf(before))
    const [digits = ''] = /\d\.\d+/u.exec(text.slice(start)) ?? []
    const last = text.indexOf(digits, start) + digits.length - 1
    const planted = `${text.slice(0, last)}${(Number(text[last]) + 5) % 10}${text.slice(last + 1)}`
    const file = new Sqlite(`${portal.folder}/portal.sqlite`)
    file.exec('drop trigger method_run_is_kept')
    file.prepare(`update method_run set ${column} = ? where id = ?`).run(planted, runId)
    file.close()
  }

  it('with one changed digit of a result is reported, with both values', async () => {
    const { runId } = await runParasitics(portal, osterby)
    const value = resultOf(await readRun(portal, osterby.consultant, runId), 'cPar')
    await plantDigit(runId, 'result', '"key":"cPar"')
    const { isSame, sentence } = await recompute(runId)
    expect(isSame).toBe(false)
    expect(sentence).toMatch(/^Parasitic capacitance is stored as [\d.]+e-10 F; repeated, it is/u)
    expect(sentence).toContain(`repeated, it is ${value} F.`)
  })

  it('with a changed digit in an input is reported, even where every result still fits', async () => {
    const { runId } = await runParasitics(portal, osterby)
    await plantDigit(runId, 'inputs', '"zeta1":')
    expect((await recompute(runId)).sentence).toMatch(
      /^Damping ratio was taken from run 2 as 0\.0\d+; that run/u,
    )
  })

  it('on a run whose own digit was changed is reported by the name of that run', async () => {
    const { runId, bareRunId } = await runParasitics(portal, osterby)
    await plantDigit(bareRunId, 'result', '"key":"naturalFrequency"')
    expect((await recompute(runId)).sentence).toMatch(
      /^Run 1, Ring of o01_bare.csv, SW: Undamped ring frequency is stored as/u,
    )
  })

  it('on a capture whose bytes were changed is reported by the hash', async () => {
    const { bareId, bareRunId, runId } = await runParasitics(portal, osterby)
    writeFileSync(portal.deps.files.pathOf(bareId), bytesOf('time,voltage\n0,1\n'))
    expect((await recompute(bareRunId)).sentence).toMatch(/^The bytes of o01_bare.csv have changed/u)
    expect((await recompute(runId)).sentence).toMatch(/^Run 1, .* bytes of o01_bare.csv have changed/u)
  })

  it('is measured from the bytes again, not from what an earlier reading kept', async () => {
    const { bareRunId, bareId } = await runParasitics(portal, osterby)
    const kept = portal.deps.files.pathOf(`${bareId}.ch0.f64`)
    writeFileSync(kept, new Uint8Array(160_000))
    expect((await recompute(bareRunId)).isSame).toBe(true)
  })
})
