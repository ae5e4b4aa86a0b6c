/** The only source of "now". Instants are UTC milliseconds since the epoch. */
export type Clock = { readonly now: () => number }
