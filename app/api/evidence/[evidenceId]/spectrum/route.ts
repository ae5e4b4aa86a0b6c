import { handle, privateJson, problem } from '@/lib/server/http'
import { captureSpectra } from '@/lib/server/operations'

/** The spectrum of a part of one channel: `?channel=0&from=0&to=1e-6&window=hann`. */
export const GET = handle<{ readonly evidenceId: string }>(async ({ deps, actor, request, params }) => {
  const wanted = Object.fromEntries(new URL(request.url).searchParams)
  const spectrum = await captureSpectra.captureSpectrum.execute(deps, actor, {
    ...wanted,
    evidenceId: params.evidenceId,
  })
  return spectrum.ok ? privateJson(spectrum.value) : problem(spectrum.error, deps.request.id)
})
