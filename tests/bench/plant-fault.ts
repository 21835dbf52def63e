import mysql from 'mysql2/promise'

/**
 * The negative control: makes every 40th listing dearer by a cent behind the back of brute force. A run that does
 * not report it checks nothing.
 */
export async function plantFault(ownerUrl: string): Promise<void> {
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query('UPDATE listing_search SET price1 = price1 + 1 WHERE listing_id % 40 = 0')
  await owner.end()
}
