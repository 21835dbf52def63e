import {
  bigint,
  index,
  int,
  mediumint,
  mysqlTable,
  primaryKey,
  smallint,
  tinyint,
  uniqueIndex,
  varbinary,
} from 'drizzle-orm/mysql-core'

const uint = () => int({ unsigned: true }).notNull()
const usmall = () => smallint({ unsigned: true }).notNull()
const utiny = () => tinyint({ unsigned: true }).notNull()
/** Counts and cents up to 16,777,215: a byte less in every index. */
const umedium = () => mediumint({ unsigned: true }).notNull()
const ubig = () => bigint({ mode: 'bigint', unsigned: true }).notNull()

/**
 * One narrow row for each listing that may be found now, clustered by category and place; every column is a fact
 * that search tests, so that a search never leaves its index. Read and written by server/search only.
 */
export const listingSearch = mysqlTable(
  'listing_search',
  {
    category: utiny(),
    /** Hilbert index, 16 + 16 bits, of the cell's centre: neighbours on Earth are neighbours in the index. */
    hil: uint(),
    listingId: uint(),
    /** 0: the listing names no species. */
    species: usmall(),
    // Earth-centred, decimetres: the squared chord is an exact integer that sorts like the distance, without trig.
    x: int().notNull(),
    y: int().notNull(),
    z: int().notNull(),
    qty: umedium(),
    minQty: umedium(),
    // Prices fall with the count: price1 from the smallest order on, price2 from from2 on, and so on.
    price1: umedium(),
    from2: umedium(),
    price2: umedium(),
    from3: umedium(),
    price3: umedium(),
    from4: umedium(),
    price4: umedium(),
    /** Fifth to eighth price, rare: 7 digits of count and 8 of cents each. */
    moreTiers: varbinary({ length: 60 }).notNull(),
    /** The least that any order of the everyday size can cost apiece: where the walk by price stands. */
    smallPrice: umedium(),
    sizeLoMm: usmall(),
    sizeHiMm: usmall(),
    // Days since 2020-01-01 on which the listing can be had; openDays holds day d in bit d mod 64.
    nextDay: usmall(),
    lastDay: usmall(),
    openDays: ubig(),
    pickup: utiny(),
    /** Origin band × animal class × packing class; 0: not shipped. */
    lane: usmall(),
    /** One bit a state that it is shipped to. */
    shipStates: ubig(),
    /** One bit a state in which the listing must not be shown. */
    hiddenStates: ubig(),
    /** 0 best … 500 worst, 501 not rated yet. */
    ratingRank: usmall(),
    // Millionths of a degree: exact, so that a counter that is added to and taken from comes back to zero.
    latE6: int().notNull(),
    lngE6: int().notNull(),
    sellerId: uint(),
    rev: uint(),
    // Where map_cell counts this row now (category 0: nowhere), so that the counters can always be put right.
    countedCategory: utiny().default(0),
    countedHil: uint().default(0),
  },
  (t) => {
    const facts = [
      t.qty,
      t.minQty,
      t.price1,
      t.from2,
      t.price2,
      t.from3,
      t.price3,
      t.from4,
      t.price4,
    ] as const
    const rest = [t.moreTiers, t.sizeLoMm, t.sizeHiMm, t.nextDay, t.lastDay, t.openDays] as const
    const who = [t.pickup, t.lane, t.shipStates, t.hiddenStates] as const
    return [
      primaryKey({ columns: [t.category, t.hil, t.listingId] }),
      uniqueIndex('u_listing').on(t.listingId),
      // Most searches name a species: all four sorts read its circle here. Covering, as a look-up a row costs 3 to 7 times more.
      index('k_species').on(t.species, t.hil, t.x, t.y, t.z, ...facts, ...rest, ...who, t.ratingRank),
      // What is safely shipped in a week: a few lanes out of thousands, so this reads hardly more than it finds.
      index('k_lane').on(
        t.lane,
        t.hil,
        t.category,
        t.species,
        t.x,
        t.y,
        t.z,
        ...facts,
        ...rest,
        t.pickup,
        t.shipStates,
        t.hiddenStates,
        t.ratingRank,
      ),
      // Cheapest of a category in a wide circle: walk upwards and stop at a page. Covering for the same reason.
      index('k_price').on(
        t.category,
        t.smallPrice,
        t.listingId,
        t.x,
        t.y,
        t.z,
        t.species,
        ...facts,
        ...rest,
        ...who,
      ),
      // Soonest and best rated in a wide circle: walked like prices, but asked for less often, so they hold only what
      // tells a row inside the circle; the other filters are looked up for those few.
      index('k_soonest').on(t.category, t.nextDay, t.x, t.y, t.z),
      index('k_rated').on(t.category, t.ratingRank, t.x, t.y, t.z),
    ]
  },
)

/** Pre-summed marks of the map: how many listings stand in a quadtree cell. Kept in step with listing_search. */
export const mapCell = mysqlTable(
  'map_cell',
  {
    lvl: utiny(),
    category: utiny(),
    cell: uint(),
    n: int().notNull(),
    sumLatE6: bigint({ mode: 'number' }).notNull(),
    sumLngE6: bigint({ mode: 'number' }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.lvl, t.category, t.cell] })],
)
