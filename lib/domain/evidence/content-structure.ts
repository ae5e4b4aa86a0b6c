/** Just enough of each format to tell a whole file from a broken or mislabelled one. Nothing is unpacked or drawn. */

export type PictureSize = { readonly width: number; readonly height: number }

const viewOf = (bytes: Uint8Array) => new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
const latin1 = (bytes: Uint8Array) =>
  Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength).toString('latin1')

/** Begins with the header of ISO 32000 and ends with a cross-reference position that lies inside the file. */
export function hasPdfEnding(head: Uint8Array, tail: Uint8Array, sizeBytes: number): boolean {
  if (!/^%PDF-[12]\.\d/.test(latin1(head.subarray(0, 16)))) return false
  const position = /startxref\s+(\d{1,12})\s+%%EOF/.exec(latin1(tail.subarray(-2048)))?.[1]
  return position !== undefined && Number(position) < sizeBytes
}

/** Width and height of the IHDR chunk when the IEND chunk is there too (PNG, ISO/IEC 15948). */
export function pngSize(head: Uint8Array, tail: Uint8Array): PictureSize | null {
  if (head.length < 33 || latin1(head.subarray(12, 16)) !== 'IHDR' || !latin1(tail).includes('IEND'))
    return null
  const view = viewOf(head)
  return positive({ width: view.getUint32(16), height: view.getUint32(20) })
}

/** Width and height of the first frame header (JPEG, ITU-T T.81, markers SOF0 to SOF15 but DHT, JPG and DAC). */
export function jpegSize(head: Uint8Array): PictureSize | null {
  const view = viewOf(head)
  let position = 2
  while (position + 9 <= head.length) {
    if (view.getUint8(position) !== 0xff) return null
    const marker = view.getUint8(position + 1)
    if (marker === 0xff) {
      position += 1
      continue
    }
    if (isFrameHeader(marker)) {
      return positive({ height: view.getUint16(position + 5), width: view.getUint16(position + 7) })
    }
    const length = view.getUint16(position + 2)
    if (length < 2) return null
    position += 2 + length
  }
  return null
}

const isFrameHeader = (marker: number) =>
  marker >= 0xc0 && marker <= 0xcf && marker !== 0xc4 && marker !== 0xc8 && marker !== 0xcc

const positive = (size: PictureSize): PictureSize | null => (size.width > 0 && size.height > 0 ? size : null)

const mostEntries = 10_000

/** The end-of-central-directory record is there and points inside the file; a million entries are not taken in. */
export function hasWholeZipDirectory(tail: Uint8Array, sizeBytes: number): boolean {
  const start = latin1(tail).lastIndexOf('PK\u0005\u0006')
  if (start < 0 || start + 22 > tail.length) return false
  const view = viewOf(tail)
  const entries = view.getUint16(start + 10, true)
  const directoryEnd = view.getUint32(start + 16, true) + view.getUint32(start + 12, true)
  return entries > 0 && entries <= mostEntries && directoryEnd <= sizeBytes
}

/** No NUL and no other control character but white space; UTF-16 with its byte-order mark counts as text. */
export function looksLikeText(bytes: Uint8Array): boolean {
  const isUtf16 = (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)
  return isUtf16 || bytes.every((byte) => byte >= 0x20 || (byte >= 0x09 && byte <= 0x0d) || byte === 0x1a)
}
