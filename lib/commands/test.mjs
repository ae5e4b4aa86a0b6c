import { build } from './build.mjs'
import { installPackages, installTestTools } from './install.mjs'
import { runBin } from './run.mjs'
import { say } from './say.mjs'

const steps = [
  ['Types of the routes', () => runBin('next', ['typegen'])],
  ['Format', () => runBin('prettier', ['--check', '.', '--log-level', 'warn'])],
  ['Lint', () => runBin('eslint', ['.', '--max-warnings', '0'])],
  ['Types', () => runBin('tsc', ['--noEmit'])],
  [
    'Import rules',
    () =>
      runBin('depcruise', [
        'app',
        'components',
        'db',
        'emails',
        'lib',
        'migrations',
        'pdf',
        'tests',
        'proxy.ts',
        'instrumentation.ts',
        '--config',
        'dependency-cruiser.cjs',
      ]),
  ],
  ['Build', build],
  ['Unit, reference, integration and security tests', () => runBin('vitest', ['run'])],
  ['Browser tests', () => runBin('playwright', ['test'])],
]

process.env.NEXT_TELEMETRY_DISABLED = '1'
await installPackages()
await installTestTools()
for (const [name, step] of steps) {
  say(name)
  try {
    await step()
  } catch (error) {
    say(`${name}: failed. ${error.message}`)
    process.exit(1)
  }
}
say('All checks passed')
