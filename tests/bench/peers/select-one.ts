import { rawPool } from '@/db/client'
import type { OpenPeer } from '@/tests/bench/peers/peer'

/** The least that any question to the database can cost. */
export const openSelectOne: OpenPeer = async () => ({
  name: 'SELECT 1',
  shapes: ['A', 'B', 'C', 'D', 'E', 'F', 'G'],
  every: 1,
  find: async () => {
    await rawPool().query({ sql: 'SELECT 1', rowsAsArray: true })
    return null
  },
  close: async () => {},
})
