import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { taxaOf } from '@/server/rules/ask-gate'
import { hiddenStates } from '@/server/rules/hidden-states'
import { loadRules } from '@/server/rules/rule-store'
import { removeSearchRows, writeSearchRows } from '@/server/search/listing-search-store'
import { readSellable, readWindowsWithRoom } from '@/server/search/projection-store'
import { searchRowOf } from '@/server/search/search-row-of'

const MOST_AT_ONCE = 500

async function projectSome(tx: Tx, listingIds: number[]): Promise<void> {
  const at = now()
  const facts = await readSellable(tx, listingIds)
  const ids = facts.map((one) => one.listingId)
  const [windows, rules] = await Promise.all([
    readWindowsWithRoom(ids, at, tx),
    loadRules({ taxonIds: [...new Set(facts.flatMap((one) => taxaOf(one.body)))] }, tx),
  ])
  // Real time: revisions rise although the demo's date may stand anywhere.
  const rev = Math.floor(Date.now() / 1000)
  const rows = facts.flatMap((one) => {
    const taxa = taxaOf(one.body)
    const batch = { body: one.body, sellerState: one.state }
    const own = rules.filter((rule) => taxa.includes(rule.taxonId))
    const row = searchRowOf(one, {
      windows: windows.filter((window) => window.listingId === one.listingId),
      hiddenStates: hiddenStates(batch, own, at.toISOString().slice(0, 10)),
      rev,
    })
    return row ? [row] : []
  })
  const found = new Set(rows.map((row) => row.listingId))
  await writeSearchRows(tx, rows)
  const gone = listingIds.filter((id) => !found.has(id))
  if (gone.length > 0) await removeSearchRows(tx, gone)
}

/**
 * Brings search in step with listings, versions, sellers and windows, inside the transaction that changed them: no
 * search ever finds what cannot be bought. Every writer calls it.
 */
export async function projectListings(tx: Tx, listingIds: number[]): Promise<void> {
  for (let from = 0; from < listingIds.length; from += MOST_AT_ONCE) {
    await projectSome(tx, listingIds.slice(from, from + MOST_AT_ONCE))
  }
}
