/** Small whole files of each kind, made here so that a test says what is in them. */

export const bytesOf = (text: string): Uint8Array => new Uint8Array(Buffer.from(text, 'latin1'))

export function streamOf(bytes: Uint8Array): ReadableStream<Uint8Array> {
  return new ReadableStream({
    start: (controller) => {
      if (bytes.byteLength > 0) controller.enqueue(bytes)
      controller.close()
    },
  })
}

/** The least PDF that says where its cross-reference is, filled up with a comment to the size that is asked for. */
export function pdfBytes(size = 200): Uint8Array {
  const head = '%PDF-1.7\n1 0 obj\n<< /Type /Catalog >>\nendobj\n%'
  const tail = '\ntrailer << /Root 1 0 R >>\nstartxref\n9\n%%EOF\n'
  return bytesOf(head + 'x'.repeat(size - head.length - tail.length) + tail)
}

/** One transparent pixel. */
export function pngBytes(): Uint8Array {
  const base64 =
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg=='
  return new Uint8Array(Buffer.from(base64, 'base64'))
}

/** An archive that holds one empty file called "a". */
export function zipBytes(): Uint8Array {
  const entry = `${'\u0000'.repeat(4)}${'\u0000'.repeat(18)}\u0001\u0000\u0000\u0000`
  const local = `PK\u0003\u0004\u0014\u0000${entry.slice(2)}a`
  const central = `PK\u0001\u0002\u0014\u0000\u0014\u0000${'\u0000'.repeat(20)}\u0001\u0000${'\u0000'.repeat(16)}a`
  const size = String.fromCharCode(central.length, 0, 0, 0)
  const start = String.fromCharCode(local.length, 0, 0, 0)
  const end = `PK\u0005\u0006\u0000\u0000\u0000\u0000\u0001\u0000\u0001\u0000${size}${start}\u0000\u0000`
  return bytesOf(local + central + end)
}

type CaptureText = { readonly samples?: number; readonly spikeAt?: number }

/** A capture at 1 GS/s of a slow triangle below 10 V, with a single sample of 99 V where a spike is wanted. */
export function captureText({ samples = 100, spikeAt = -1 }: CaptureText = {}): string {
  const rows = Array.from({ length: samples }, (_, index) => {
    const value = index === spikeAt ? 99 : (index % 1000) / 100
    return `${index}e-9,${value}`
  })
  return `Time (s),SW (V)\n${rows.join('\n')}\n`
}
