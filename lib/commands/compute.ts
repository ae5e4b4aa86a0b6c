import { readFileSync } from 'node:fs'
import { parseArgs } from 'node:util'

import { z } from 'zod'

import { inputSchema } from '@/lib/core/method/input-schema'
import { findMethod, methods } from '@/lib/core/method/registry'

import { computeCapture } from './compute-capture'
import { ComputeProblem } from './compute-problem'

const usage = [
  'npm run compute -- <method> <inputs.json | ->   runs a method; “-” reads the inputs from standard input',
  'npm run compute -- --list                       the methods with the schemas of their inputs',
  'npm run compute -- capture <file> [--channel <name>]   the analysis of a capture',
].join('\n')

const scalarOrRows = z.union([
  z.number(),
  z.string(),
  z.array(
    z.union([
      z.array(z.union([z.number(), z.string()])),
      z.record(z.string(), z.union([z.number(), z.string()])),
    ]),
  ),
])

const plainInputs = z.record(z.string(), scalarOrRows)

const withTolerances = z.strictObject({
  inputs: plainInputs,
  tolerances: z.record(z.string(), z.string()).default({}),
})

/** Either the inputs alone, or inputs and tolerances: `{"inputs": {…}, "tolerances": {"cAdd": "5 %"}}`. */
const inputFile = z.union([withTolerances, plainInputs.transform((inputs) => ({ inputs, tolerances: {} }))])

/** The answer to the arguments of the command, as JSON. Throws a `ComputeProblem` for what cannot be computed. */
function answer(args: readonly string[]): unknown {
  const { values, positionals } = parseArgs({
    args: [...args],
    allowPositionals: true,
    options: { list: { type: 'boolean' }, channel: { type: 'string' } },
  })
  if (values.list === true) return list()
  const [name, file] = positionals
  if (name === undefined || file === undefined || positionals.length > 2) {
    throw new ComputeProblem('usage', `Say what to compute:\n${usage}`)
  }
  return name === 'capture' ? computeCapture(file, values.channel) : runNamed(name, file)
}

const list = () =>
  methods.map(({ id, version, title, purpose, inputs, example }) => ({
    id,
    version,
    title,
    purpose,
    inputs: inputSchema(inputs),
    example,
  }))

function runNamed(id: string, file: string): unknown {
  const method = findMethod(id)
  if (!method) {
    throw new ComputeProblem('unknown_method', `There is no method “${id}”; --list names those that are.`)
  }
  const { inputs, tolerances } = readInputFile(file)
  const run = method.run(inputs, tolerances)
  if (!run.ok) throw new ComputeProblem(run.error.code, run.error.message, run.error.fields)
  return run.value
}

function readInputFile(file: string): z.output<typeof inputFile> {
  const name = file === '-' ? 'standard input' : file
  try {
    return inputFile.parse(JSON.parse(readFileSync(file === '-' ? 0 : file, 'utf8')))
  } catch (error) {
    if (error instanceof z.ZodError) {
      throw new ComputeProblem('invalid_input', `${name} holds no inputs: an object of values is expected.`)
    }
    const reason = error instanceof Error ? error.message : String(error)
    throw new ComputeProblem('invalid_input', `${name} cannot be read as JSON: ${reason}`)
  }
}

function main(): void {
  try {
    process.stdout.write(`${JSON.stringify(answer(process.argv.slice(2)), null, 2)}\n`)
  } catch (error) {
    if (!(error instanceof ComputeProblem) && !isUsageError(error)) throw error
    const problem =
      error instanceof ComputeProblem
        ? error
        : new ComputeProblem('usage', `${error instanceof Error ? error.message : ''}\n${usage}`)
    process.stdout.write(`${JSON.stringify(problem.details(), null, 2)}\n`)
    process.exitCode = 1
  }
}

/** What `parseArgs` throws for an option that it does not know. */
const isUsageError = (error: unknown): boolean =>
  error instanceof TypeError && 'code' in error && String(error.code).startsWith('ERR_PARSE_ARGS')

main()
