declare const unit: unique symbol

/**
 * A number with its unit in the type. A plain number may be given where a unit is wanted, but
 * one unit is never accepted for another: degrees do not pass for inches.
 */
type Unit<Name extends string> = number & { readonly [unit]?: Name }

export type Inches = Unit<'inches'>
export type Degrees = Unit<'degrees'>
export type Cents = Unit<'cents'>
export type Pounds = Unit<'pounds'>
