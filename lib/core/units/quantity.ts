declare const dimension: unique symbol

/** A number in the SI unit of one quantity. Two quantities do not mix without saying so. */
type Quantity<Name extends string> = number & { readonly [dimension]: Name }

export type Hertz = Quantity<'frequency'>
export type Seconds = Quantity<'time'>
export type Henries = Quantity<'inductance'>
export type Farads = Quantity<'capacitance'>
export type Ohms = Quantity<'resistance'>
export type Volts = Quantity<'voltage'>
export type Amperes = Quantity<'current'>
export type Watts = Quantity<'power'>

export const hertz = (value: number): Hertz => value as Hertz
export const seconds = (value: number): Seconds => value as Seconds
export const henries = (value: number): Henries => value as Henries
export const farads = (value: number): Farads => value as Farads
export const ohms = (value: number): Ohms => value as Ohms
export const volts = (value: number): Volts => value as Volts
export const amperes = (value: number): Amperes => value as Amperes
export const watts = (value: number): Watts => value as Watts
