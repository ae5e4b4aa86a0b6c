/**
 * "Time / ns": the quantity divided by its unit, as the SI Brochure (9th edition, 5.4.1) writes it on axes; a compound unit
 * goes in brackets, "Field strength / (dBµV/m)". Without a unit the quantity stands alone.
 */
export const quantityOverUnit = (quantity: string, unit: string): string => {
  if (unit === '') return quantity
  return `${quantity} / ${/[/·]/.test(unit) ? `(${unit})` : unit}`
}
