import { readdirSync } from 'node:fs'

import { build } from 'esbuild'

const folder = 'lib/workers'
const suffix = '.worker.ts'

/** The marker package only means something to the bundler of the pages. */
const withoutServerOnly = {
  name: 'without-server-only',
  setup(bundle) {
    bundle.onResolve({ filter: /^server-only$/ }, () => ({ path: 'server-only', namespace: 'empty' }))
    bundle.onLoad({ filter: /.*/, namespace: 'empty' }, () => ({ contents: '' }))
  },
}

// One file for each worker thread, named without the suffix; packages are loaded from node_modules at run time.
const names = readdirSync(folder).filter((name) => name.endsWith(suffix))
await build({
  entryPoints: Object.fromEntries(names.map((name) => [name.slice(0, -suffix.length), `${folder}/${name}`])),
  outdir: '.workers',
  outExtension: { '.js': '.mjs' },
  bundle: true,
  format: 'esm',
  platform: 'node',
  target: 'node20',
  packages: 'external',
  jsx: 'automatic',
  plugins: [withoutServerOnly],
  logLevel: 'warning',
})
