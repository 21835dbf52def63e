/**
 * @typedef {object} Check
 * @property {string} name `npm run check:<name>` runs it in full
 * @property {string[]} command the whole check; it writes its figures with scripts/write-report.mjs
 * @property {string[]} sliceCommand a part of a minute or less, run by `npm test`
 * @property {string[]} [faultCommand] the same with a planted fault: must end with exit code 1
 * @property {boolean} ci whether .ci/run runs the whole check after the tests
 */

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
    name: 'season',
    command: ['node', '--import', 'tsx', 'scripts/check-season.ts'],
    sliceCommand: ['node', '--import', 'tsx', 'scripts/check-season.ts', '--slice'],
    faultCommand: ['node', '--import', 'tsx', 'scripts/check-season.ts', '--plant-fault'],
    ci: true,
  },
]
