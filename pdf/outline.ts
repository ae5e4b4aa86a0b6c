/** Puts a view into the outline of the file. The renderer does this for every view; its types say it only of pages. */
export const inOutline = (title: string): object => ({ bookmark: title })
