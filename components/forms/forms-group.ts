import './without-eval'

// The lazily loaded group: everything behind this module is one chunk with the form library and the contracts in it.
// Only ever imported by React.lazy: `lazy(() => import(…).then((group) => ({ default: group.X })))`.
export { BatchDesk } from './batch/batch-desk'
export { FarmForm } from './farm/farm-form'
export { SupplyDesk } from './supplies/supply-desk'
