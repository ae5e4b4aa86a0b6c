import { byteSizeInWords } from '@/lib/core/byte-size'

import { Quantity } from '../ui/quantity'

export const ByteSize = ({ bytes }: { readonly bytes: number }) => {
  const [value = '', unit = ''] = byteSizeInWords(bytes).split('\u00a0')
  return <Quantity value={value} unit={unit} />
}
