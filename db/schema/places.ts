import { double, index, int, mysqlTable, primaryKey, smallint, varchar } from 'drizzle-orm/mysql-core'

export const zipPlace = mysqlTable(
  'zip_place',
  {
    zip: varchar({ length: 5 }).primaryKey(),
    city: varchar({ length: 64 }).notNull(),
    state: varchar({ length: 2 }).notNull(),
    lat: double().notNull(),
    lng: double().notNull(),
  },
  // Which town and state lie nearest to a location cell.
  (t) => [index('k_zip_point').on(t.lat, t.lng)],
)

export const cityPlace = mysqlTable(
  'city_place',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    name: varchar({ length: 64 }).notNull(),
    state: varchar({ length: 2 }).notNull(),
    lat: double().notNull(),
    lng: double().notNull(),
    population: int({ unsigned: true }).notNull(),
  },
  (t) => [index('k_city_name').on(t.name, t.population), index('k_city_state').on(t.state, t.name)],
)

/** GeoNames population inside each 0.05 and 0.1 degree cell; absent means none. Decides how far a cell must grow. */
export const cellPopulation = mysqlTable(
  'cell_population',
  {
    sizeThousandths: smallint({ unsigned: true }).notNull(),
    iy: smallint({ unsigned: true }).notNull(),
    ix: smallint({ unsigned: true }).notNull(),
    population: int({ unsigned: true }).notNull(),
  },
  (t) => [primaryKey({ columns: [t.sizeThousandths, t.iy, t.ix] })],
)
