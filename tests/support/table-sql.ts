import { toSnakeCase } from 'drizzle-orm/casing'
import { getTableConfig, type MySqlTable } from 'drizzle-orm/mysql-core'

const name = (column: { name: string }) => `\`${toSnakeCase(column.name)}\``

/** CREATE TABLE of a table without foreign keys, for measurements that need this table and no other. */
export function tableSql(table: MySqlTable): string {
  const { name: tableName, columns, indexes, primaryKeys } = getTableConfig(table)
  const lines = columns.map((column) => {
    const fallback = column.hasDefault ? ` DEFAULT ${String(column.default)}` : ''
    return `${name(column)} ${column.getSQLType()}${column.notNull ? ' NOT NULL' : ''}${fallback}`
  })
  for (const key of primaryKeys) lines.push(`PRIMARY KEY (${key.columns.map(name).join(', ')})`)
  for (const { config } of indexes) {
    const parts = config.columns.map((part) => {
      if (!('name' in part)) throw new Error(`${config.name} has a part that is no column`)
      return name(part)
    })
    lines.push(`${config.unique ? 'UNIQUE KEY' : 'KEY'} ${config.name} (${parts.join(', ')})`)
  }
  return `CREATE TABLE ${tableName} (\n  ${lines.join(',\n  ')}\n) ENGINE=InnoDB`
}
