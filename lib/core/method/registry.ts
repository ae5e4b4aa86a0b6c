import type { Result } from '../result'
import { rcSnubber } from '../snubber/rc-snubber.method'
import { ringParasitics } from '../snubber/ring-parasitics.method'
import type { InputDefinitions, Method, MethodError } from './method'
import type { RawInput } from './read-inputs'
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

/** Every method of the practice. Adding one is a folder, its test, and a line here. */
export const methods: readonly RegisteredMethod[] = [register(ringParasitics), register(rcSnubber)]

export const findMethod = (id: string): RegisteredMethod | undefined =>
  methods.find((method) => method.id === id)

function register<const Inputs extends InputDefinitions>(method: Method<Inputs>): RegisteredMethod {
  const { compute: _compute, computeResults: _computeResults, ...definition } = method
  return { ...definition, run: (raw, tolerances) => runMethod(method, raw, tolerances) }
}
