import type { RawInput } from '@/lib/core/method/input-definition'

type ScriptHintProps = {
  readonly methodId: string
  readonly given: Readonly<Record<string, RawInput>>
}

/** The same run from a shell, for scripts. */
export const ScriptHint = ({ methodId, given }: ScriptHintProps) => (
  <>
    <p className="mb-2 max-w-measure">
      The worked example from a shell, with the same core; a tolerance goes beside the inputs, as in{' '}
      <span className="num">{'{"inputs": {…}, "tolerances": {…}}'}</span>.
    </p>
    <pre
      tabIndex={0}
      aria-label="Command that runs the worked example"
      className="num overflow-x-auto border border-rule bg-sunk p-3 text-sm"
    >
      {`echo '${JSON.stringify(given)}' |\n  npm run --silent compute -- ${methodId} -`}
    </pre>
  </>
)
