/** What a runner's own report says. */
export interface Counts {
  passed: number;
  failed: number;
  skipped: number;
  /** One line for each failure and each skipped test, with the reason where the runner knows it. */
  failures: string[];
  skips: string[];
}

export const none = (): Counts => ({ passed: 0, failed: 0, skipped: 0, failures: [], skips: [] });

export function add(a: Counts, b: Counts): Counts {
  return {
    passed: a.passed + b.passed,
    failed: a.failed + b.failed,
    skipped: a.skipped + b.skipped,
    failures: [...a.failures, ...b.failures],
    skips: [...a.skips, ...b.skips],
  };
}

interface UnitReport {
  readonly testResults: readonly {
    readonly name: string;
    readonly status: string;
    readonly message?: string;
    readonly assertionResults: readonly {
      readonly status: string;
      readonly fullName: string;
      readonly failureMessages?: readonly string[];
    }[];
  }[];
}

const firstLine = (text: string | undefined): string => (text ?? '').split('\n')[0]!.slice(0, 200);

/** From the JSON report of vitest. A file that could not be loaded holds no tests and counts as one failure. */
export function countUnit(report: UnitReport): Counts {
  const counts = none();
  for (const file of report.testResults) {
    let failedHere = 0;
    for (const { status, fullName, failureMessages } of file.assertionResults) {
      if (status === 'passed') counts.passed++;
      else if (status === 'failed') {
        failedHere++;
        counts.failures.push(`${fullName}: ${firstLine(failureMessages?.[0])}`);
      } else {
        counts.skipped++;
        counts.skips.push(fullName);
      }
    }
    if (file.status === 'failed' && failedHere === 0) {
      failedHere = 1;
      counts.failures.push(`${file.name}: ${firstLine(file.message)}`);
    }
    counts.failed += failedHere;
  }
  return counts;
}

interface Suite {
  readonly title: string;
  readonly suites?: readonly Suite[];
  readonly specs: readonly {
    readonly title: string;
    readonly tests: readonly {
      readonly status: 'expected' | 'unexpected' | 'flaky' | 'skipped';
      readonly annotations: readonly { readonly type: string; readonly description?: string }[];
      readonly results: readonly { readonly error?: { readonly message?: string } }[];
    }[];
  }[];
}
interface BrowserReport {
  readonly suites: readonly Suite[];
  readonly errors: readonly { readonly message?: string }[];
}

/** From the JSON report of Playwright. An error outside any test counts as one failure; so does a flaky test. */
export function countBrowser(report: BrowserReport): Counts {
  const counts = none();
  const visit = (suite: Suite): void => {
    suite.suites?.forEach(visit);
    for (const { title, tests } of suite.specs) {
      for (const { status, annotations, results } of tests) {
        if (status === 'expected') counts.passed++;
        else if (status === 'skipped') {
          counts.skipped++;
          const reason = annotations.find(({ type }) => type === 'skip' || type === 'fixme')?.description;
          counts.skips.push(reason === undefined ? title : `${title} (${reason})`);
        } else {
          counts.failed++;
          counts.failures.push(`${title}: ${firstLine(results.at(-1)?.error?.message)}`);
        }
      }
    }
  };
  report.suites.forEach(visit);
  for (const { message } of report.errors) {
    counts.failed++;
    counts.failures.push(firstLine(message));
  }
  return counts;
}

/** The closing line. */
export const summary = ({ passed, failed, skipped }: Counts): string =>
  `${passed} passed, ${failed} failed, ${skipped} skipped`;
