/** Mean advance of the sans face in units of its size; measured on Source Sans 3, digits and lower case. */
const sansAdvance = 0.5
/** Source Code Pro advances every character by 0.6 of its size. */
const monoAdvance = 0.6

/** Width that a text will take, near enough to keep labels apart; the renderers measure nothing. */
export const textWidth = (text: string, size: number, face: 'sans' | 'mono'): number =>
  Array.from(text).length * size * (face === 'mono' ? monoAdvance : sansAdvance)
