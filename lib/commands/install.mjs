import { execFileSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'

import { run } from './run.mjs'
import { say, stop } from './say.mjs'

/** Programs by the Debian package that brings them: to compile the database driver, and to check results in tests. */
const buildTools = { python3: 'python3', make: 'make', 'g++': 'g++' }
const testTools = {
  chromium: 'chromium',
  pdfsig: 'poppler-utils',
  qpdf: 'qpdf',
  certutil: 'libnss3-tools',
  openssl: 'openssl',
  ngspice: 'ngspice',
}

/** Python libraries that results are held against, and the packages that bring them. */
const testLibraries = { numpy: 'python3-numpy', scipy: 'python3-scipy' }

/** Installs the packages of package-lock.json where they are absent or of other versions. */
export async function installPackages() {
  checkNode()
  if (isInstalled()) return
  await installMissing(absent(buildTools, isOnPath), 'to compile the database driver')
  say('Installing packages with npm ci (about two minutes; the database driver is compiled)')
  await run('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'])
}

/** Installs what the tests check results with: a browser, PDF tools, a circuit simulator, numerical libraries. */
export const installTestTools = () =>
  installMissing([...absent(testTools, isOnPath), ...absent(testLibraries, isInPython)], 'for the tests')

/** npm keeps a list of what it put into node_modules; it must hold every package of the lock file that is not optional. */
function isInstalled() {
  const installed = packagesOf('node_modules/.package-lock.json')
  const wanted = Object.entries(packagesOf('package-lock.json') ?? {})
  return wanted.every(
    ([name, { version, optional }]) => name === '' || optional || installed?.[name]?.version === version,
  )
}

function packagesOf(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')).packages : undefined
}

function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major < 20 || (major === 20 && minor < 19)) {
    stop(`Node.js ${process.versions.node} is too old for the portal: install Node.js 20.19 or newer.`)
  }
}

const absent = (tools, isThere) =>
  Object.entries(tools)
    .filter(([name]) => !isThere(name))
    .map(([, debianPackage]) => debianPackage)

async function installMissing(missing, purpose) {
  if (missing.length === 0) return
  const packages = [...new Set(missing)]
  const command = `apt-get install -y --no-install-recommends ${packages.join(' ')}`
  if (!isOnPath('apt-get')) {
    stop(
      `Needed ${purpose} and not found: ${packages.join(', ')}. Install them with your system's package manager.`,
    )
  }
  if (process.getuid?.() !== 0) {
    stop(
      `Needed ${purpose} and not found: ${packages.join(', ')}. Run: sudo apt-get update && sudo ${command}`,
    )
  }
  say(`Installing ${packages.join(', ')} ${purpose}`)
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' }
  await run('apt-get', ['update', '-qq'], { env })
  await run('sh', ['-c', `${command} -qq > /dev/null`], { env })
}

const isOnPath = (program) => succeeds('sh', ['-c', `command -v ${program}`])

/** In the Python of the path or in the system's, which may be another one. */
const isInPython = (library) =>
  ['python3', '/usr/bin/python3'].some((python) => succeeds(python, ['-c', `import ${library}`]))

function succeeds(program, args) {
  try {
    execFileSync(program, args, { stdio: 'ignore' })
    return true
  } catch {
    return false
  }
}
