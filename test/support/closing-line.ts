import { writeFileSync } from 'node:fs';
import type { Reporter, TestModule } from 'vitest/node';
import { DefaultReporter } from 'vitest/node';

/** The usual output, and the counts of this run in the file that TEST_COUNTS names, for the sum at the very end. */
export default class ClosingLine extends DefaultReporter implements Reporter {
  override onTestRunEnd(
    modules: readonly TestModule[],
    errors: Parameters<DefaultReporter['onTestRunEnd']>[1],
    reason: Parameters<DefaultReporter['onTestRunEnd']>[2],
  ) {
    super.onTestRunEnd(modules as TestModule[], errors, reason);
    let passed = 0;
    let failed = errors.length;
    for (const module of modules) {
      const states = [...module.children.allTests()].map((test) => test.result().state);
      const bad = states.filter((state) => state === 'failed').length;
      passed += states.filter((state) => state === 'passed').length;
      // A file that broke while it was loaded, or in a hook, has no failed test of its own.
      failed += bad === 0 && !module.ok() ? 1 : bad;
    }
    if (process.env.TEST_COUNTS) writeFileSync(process.env.TEST_COUNTS, JSON.stringify({ passed, failed }));
  }
}
