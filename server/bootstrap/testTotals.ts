/** Of what Jest writes with --json. */
export interface ProjectReport {
  numPassedTests: number;
  numFailedTests: number;
  /** Files that could not be run at all. */
  numRuntimeErrorTestSuites: number;
}

export interface Outcome {
  code: number | null;
  /** null: Jest did not come so far. */
  report: ProjectReport | null;
}

/** Totals over projects. A file that could not be run is a failure, and so is a project that failed without one. Pure. */
export function addUp(outcomes: Outcome[]): { passed: number; failed: number } {
  let passed = 0;
  let failed = 0;
  for (const { code, report } of outcomes) {
    const faults = report ? report.numFailedTests + report.numRuntimeErrorTestSuites : 0;
    passed += report?.numPassedTests ?? 0;
    failed += faults === 0 && code !== 0 ? 1 : faults;
  }
  return { passed, failed };
}
