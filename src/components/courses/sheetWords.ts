/** Sheet GF-01 by its number. */
export const sheetName = (sheet: { sheetNumber: number }) =>
  `GF-${String(sheet.sheetNumber).padStart(2, '0')}`

/** A price in words: `free`, `€34`. */
export function formatPrice(sheet: { priceCents: number; currency: string }): string {
  if (sheet.priceCents === 0) return 'free'
  return (sheet.priceCents / 100).toLocaleString('en-GB', {
    style: 'currency',
    currency: sheet.currency,
    minimumFractionDigits: sheet.priceCents % 100 === 0 ? 0 : 2,
  })
}

/** `Rev A`, or `draft`. */
export const revisionName = (revision: string) =>
  revision === 'draft' ? 'draft' : `Rev ${revision}`
