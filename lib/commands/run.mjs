import { spawn } from 'node:child_process'

/** Runs a program to its end with its output shown; rejects when it fails. */
export function run(program, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { stdio: 'inherit', ...options })
    child.once('error', reject)
    child.once('exit', (code, signal) =>
      code === 0 ? resolve() : reject(new Error(`${program} ${args.join(' ')} ended with ${code ?? signal}`)),
    )
  })
}

/** As `run`, but shows what the program said only when it fails. */
export function runQuietly(program, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, { ...options, stdio: ['ignore', 'pipe', 'pipe'] })
    const said = []
    child.stdout.on('data', (part) => said.push(part))
    child.stderr.on('data', (part) => said.push(part))
    child.once('error', reject)
    child.once('exit', (code, signal) => {
      if (code === 0) return resolve()
      process.stderr.write(Buffer.concat(said))
      reject(new Error(`${program} ${args.join(' ')} ended with ${code ?? signal}`))
    })
  })
}

/** Runs a program of node_modules/.bin. */
export const runBin = (name, args, options) => run(`node_modules/.bin/${name}`, args, options)

/** Runs a TypeScript command of ours as server code. */
export const runScript = (file, args, options) =>
  run('node_modules/.bin/tsx', ['--conditions=react-server', file, ...args], options)
