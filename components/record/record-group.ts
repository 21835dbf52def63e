// The lazily loaded group of a seller's record: one chunk, imported only through lazy().
export { RecordHome } from './record-home'
