/**
 * Adds up a run of the tests. A file that does not load, an error outside every test and a run without a test count
 * as failures, so that nothing broken passes unseen.
 * @param report Vitest's JSON report; undefined when it wrote none
 * @param {number} exitCode Vitest's
 * @returns {{ passed: number, failed: number, skipped: number, remarks: string[] }}
 */
export function countTests(report, exitCode) {
  const files = report?.testResults ?? [];
  const all = files.flatMap((file) => file.assertionResults);
  const passed = all.filter(({ status }) => status === 'passed').length;
  const failedTests = all.filter(({ status }) => status === 'failed').length;
  const broken = files.filter(
    ({ status, assertionResults }) =>
      status === 'failed' && !assertionResults.some(({ status: outcome }) => outcome === 'failed'),
  );
  const skipped = all.length - passed - failedTests;
  const remarks = broken.map(({ name }) => `${name} could not be run.`);
  if (report === undefined) remarks.push('The tests ended without a report.');
  else if (all.length === 0 && broken.length === 0) remarks.push('No test was found.');
  else if (exitCode !== 0 && failedTests + broken.length === 0) remarks.push('An error happened outside every test.');
  return { passed, failed: failedTests + remarks.length, skipped, remarks };
}
