import { readFile } from 'node:fs/promises'

/**
 * Reads what vitest's JSON reporter wrote. A file that could not even be loaded has no test to blame and counts
 * as one failed. Null when nothing was written: the runner itself failed.
 * @param {string} file
 */
export async function countTests(file) {
  const report = await readFile(file, 'utf8').then(JSON.parse, () => null)
  if (report === null) return null
  /** @type {{ status: string, assertionResults: unknown[] }[]} */
  const files = report.testResults
  const unloaded = files.filter((one) => one.status === 'failed' && one.assertionResults.length === 0).length
  return { passed: report.numPassedTests, failed: report.numFailedTests + unloaded }
}
