/** One row as search reads it. */
export interface FoundRow {
  listingId: number
  dm2: number
  unitCents: number
  sortBy: number
}

/** Columns in the order of `selectedSql`. */
export function readFoundRows(rows: readonly (readonly number[])[]): FoundRow[] {
  return rows.map(([listingId = 0, dm2 = 0, unitCents = 0, sortBy = 0]) => ({
    listingId,
    dm2,
    unitCents,
    sortBy,
  }))
}
