/** One line about what a command is doing now. */
export const say = (sentence) => process.stdout.write(`» ${sentence}\n`)

/** Ends the command with a sentence that says what to do. */
export function stop(sentence) {
  process.stderr.write(`${sentence}\n`)
  process.exit(1)
}
