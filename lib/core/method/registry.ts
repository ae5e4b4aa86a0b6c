import { cableEmission } from '../emission/cable.method'
import { smallLoopEmission } from '../emission/small-loop.method'
import { filterCorner } from '../filter/filter-corner.method'
import { filterDamping } from '../filter/filter-damping.method'
import { groundingReview } from '../grounding/grounding-review.method'
import { circularLoopInductance } from '../inductance/circular-loop.method'
import { coplanarPairInductance } from '../inductance/coplanar-pair.method'
import { loopVoltage } from '../inductance/loop-voltage.method'
import { partialInductance } from '../inductance/partial-inductance.method'
import { planeSpreadingInductance } from '../inductance/plane-spreading.method'
import { polygonLoopInductance } from '../inductance/polygon-loop.method'
import { rectangularLoopInductance } from '../inductance/rectangular-loop.method'
import { traceOverPlaneInductance } from '../inductance/trace-over-plane.method'
import { viaArrayInductance } from '../inductance/via-array.method'
import { viaPartialInductance } from '../inductance/via-partial.method'
import { viaReturnInductance } from '../inductance/via-return.method'
import { wirePairInductance } from '../inductance/wire-pair.method'
import { distanceConversion } from '../limits/distance-conversion.method'
import { scanMargin } from '../limits/scan-margin.method'
import { magneticDipoleField } from '../near-field/magnetic-dipole.method'
import { polygonNearField } from '../near-field/polygon-field.method'
import { preferredValue } from '../parts/preferred-value.method'
import { receiverPulseResponse } from '../receiver/pulse-response.method'
import { spreadSpectrumEffect } from '../receiver/spread-spectrum.method'
import type { Result } from '../result'
import { planeShield } from '../shielding/plane-shield.method'
import { stitchingDistance } from '../shielding/stitching.method'
import { currentInterruptSnubber } from '../snubber/current-interrupt.method'
import { rcSnubberLoss } from '../snubber/rc-loss.method'
import { rcSnubber } from '../snubber/rc-snubber.method'
import { rcdClamp } from '../snubber/rcd-clamp.method'
import { ringDecay } from '../snubber/ring-decay.method'
import { ringInductance } from '../snubber/ring-inductance.method'
import { ringParasitics } from '../snubber/ring-parasitics.method'
import { decibelConversion } from '../spectrum/decibel-conversion.method'
import { harmonicAttribution } from '../spectrum/harmonic-attribution.method'
import { mixingProductsMethod } from '../spectrum/mixing-products.method'
import { pulseTrainSpectrum } from '../spectrum/pulse-train.method'
import { spectralWindow } from '../spectrum/spectral-window.method'
import type { InputDefinitions, RawInput } from './input-definition'
import type { Method, MethodError } from './method'
import type { RawTolerance } from './read-tolerances'
import { runMethod, type MethodRun } from './run-method'

/** A method without the types of its own inputs: what a list of all of them can offer. */
export type RegisteredMethod = Omit<Method, 'compute' | 'computeResults' | 'inputs'> & {
  readonly inputs: InputDefinitions
  readonly run: (
    raw: Readonly<Record<string, RawInput>>,
    tolerances?: Readonly<Record<string, RawTolerance>>,
  ) => Result<MethodRun, MethodError>
}

export type MethodGroup = { readonly title: string; readonly methods: readonly RegisteredMethod[] }

/** Every method of the practice by its subject. Adding one is a folder, its test, and a line here. */
export const methodGroups: readonly MethodGroup[] = [
  {
    title: 'Ringing and snubbers',
    methods: [
      register(ringParasitics),
      register(ringInductance),
      register(ringDecay),
      register(rcSnubber),
      register(rcSnubberLoss),
      register(rcdClamp),
      register(currentInterruptSnubber),
      register(preferredValue),
    ],
  },
  {
    title: 'Spectrum and limits',
    methods: [
      register(pulseTrainSpectrum),
      register(scanMargin),
      register(harmonicAttribution),
      register(mixingProductsMethod),
      register(spreadSpectrumEffect),
      register(receiverPulseResponse),
      register(spectralWindow),
      register(decibelConversion),
      register(distanceConversion),
    ],
  },
  {
    title: 'Inductance',
    methods: [
      register(polygonLoopInductance),
      register(rectangularLoopInductance),
      register(circularLoopInductance),
      register(traceOverPlaneInductance),
      register(wirePairInductance),
      register(coplanarPairInductance),
      register(partialInductance),
      register(viaReturnInductance),
      register(viaPartialInductance),
      register(viaArrayInductance),
      register(planeSpreadingInductance),
      register(loopVoltage),
    ],
  },
  {
    title: 'Emission and near field',
    methods: [
      register(smallLoopEmission),
      register(cableEmission),
      register(magneticDipoleField),
      register(polygonNearField),
    ],
  },
  {
    title: 'Return paths and shielding',
    methods: [register(planeShield), register(stitchingDistance), register(groundingReview)],
  },
  {
    title: 'Input filters',
    methods: [register(filterCorner), register(filterDamping)],
  },
]

export const methods: readonly RegisteredMethod[] = methodGroups.flatMap((group) => group.methods)

export const findMethod = (id: string): RegisteredMethod | undefined =>
  methods.find((method) => method.id === id)

function register<const Inputs extends InputDefinitions>(method: Method<Inputs>): RegisteredMethod {
  const { compute: _compute, computeResults: _computeResults, ...definition } = method
  return { ...definition, run: (raw, tolerances) => runMethod(method, raw, tolerances) }
}
