export type TestReport = {
  testResults: { name: string; status: string; assertionResults: { status: string }[] }[];
};

/** Adds up a run of the tests; `remarks` says in sentences what failed without being a test. */
export function countTests(
  report: TestReport | undefined,
  exitCode: number,
): { passed: number; failed: number; skipped: number; remarks: string[] };
