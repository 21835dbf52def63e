/**
 * @typedef {object} Check
 * @property {string} name `npm run check:<name>` runs it in full
 * @property {string[]} command the whole check; it writes its figures with scripts/write-report.mjs
 * @property {string[]} sliceCommand a part of a minute or less, run by `npm test`
 * @property {string[]} [faultCommand] the same with a planted fault: must end with exit code 1
 * @property {boolean} ci whether .ci/run runs the whole check after the tests
 */

/**
 * A file of tests/checks. Its planted faults are its own: it fails when it does not find them.
 * @param {string} name @returns {Check}
 */
const proof = (name) => ({
  name,
  command: ['node', 'scripts/run-proof.mjs', name],
  sliceCommand: ['node', 'scripts/run-proof.mjs', name, '--slice'],
  ci: false,
})

/** @type {Check[]} */
export const CHECKS = [
  {
    name: 'size',
    command: ['node', 'scripts/check-size.mjs'],
    sliceCommand: ['node', 'scripts/check-size.mjs'],
    faultCommand: ['node', 'scripts/check-size.mjs', '--plant-fault'],
    ci: false,
  },
  {
    name: 'native',
    command: ['node', 'scripts/check-native.mjs'],
    sliceCommand: ['node', 'scripts/check-native.mjs'],
    faultCommand: ['node', 'scripts/check-native.mjs', '--plant-fault'],
    ci: false,
  },
  {
    name: 'ics',
    command: ['node', '--import', 'tsx', 'scripts/check-ics.ts'],
    sliceCommand: ['node', '--import', 'tsx', 'scripts/check-ics.ts', '--cases', '500'],
    faultCommand: ['node', '--import', 'tsx', 'scripts/check-ics.ts', '--cases', '500', '--plant-fault'],
    ci: true,
  },
  {
    name: 'csv',
    command: ['node', '--import', 'tsx', 'scripts/check-csv.ts'],
    sliceCommand: ['node', '--import', 'tsx', 'scripts/check-csv.ts'],
    faultCommand: ['node', '--import', 'tsx', 'scripts/check-csv.ts', '--plant-fault'],
    ci: false,
  },
  proof('matrix'),
  proof('headers'),
  proof('privacy'),
  proof('oversell'),
  proof('crash'),
  {
    name: 'season',
    command: ['node', '--import', 'tsx', 'scripts/check-season.ts'],
    sliceCommand: ['node', '--import', 'tsx', 'scripts/check-season.ts', '--slice'],
    faultCommand: ['node', '--import', 'tsx', 'scripts/check-season.ts', '--plant-fault'],
    ci: true,
  },
]
