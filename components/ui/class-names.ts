/** Joins the class names that apply; falsy ones are left out. */
export const classNames = (...names: readonly (string | false | null | undefined)[]): string =>
  names.filter(Boolean).join(' ')
