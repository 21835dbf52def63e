// The lazily loaded group of Find: the filters and the names of all species.
export { Filters } from './filters'
