import { describe, expect, test } from 'vitest';
import type { CheckResult, Finding } from '#core/result/result.ts';
import { clearGuards, submitGuards } from '#core/review/guards.ts';

const result = (change: Partial<CheckResult> = {}): CheckResult => ({
  format: 'dropwatt-result',
  version: 1,
  method: '1.0.0',
  inputHash: 'sha256:0',
  title: 'Board',
  conditions: [],
  findings: [],
  cautions: [],
  assumptions: [],
  verdict: 'within',
  ...change,
});
const finding = (severity: Finding['severity'], ref: string | null = 'U1'): Finding => ({
  rule: 'some-rule',
  severity,
  ref,
  condition: null,
  message: 'Something is odd.',
  remedy: 'Mend it.',
});
const unsolved: CheckResult['conditions'][number] = {
  name: 'Hot',
  status: 'not-converged',
  message: null,
  regulators: [],
  sources: [],
  probes: [],
  ledger: [],
  board: null,
  energy: null,
  solver: null,
  verdict: 'not evaluated',
};
const codes = (failures: { code: string }[]) => failures.map(({ code }) => code);

describe('submission', () => {
  const guards = (given: CheckResult | null, reasons: Parameters<typeof submitGuards>[0]['reasons'] = []) =>
    codes(submitGuards({ result: given, reasons, openComments: 0 }));

  test('a sound result – passes', () => expect(guards(result())).toEqual([]));
  test('no result – stands in the way alone', () => expect(guards(null)).toEqual(['result-missing']));
  test('a note – needs no reason', () => expect(guards(result({ findings: [finding('note')] }))).toEqual([]));
  test('an exceedance – can be submitted, so that a reviewer sees it', () =>
    expect(guards(result({ verdict: 'over' }))).toEqual([]));
  test('a condition without solution – stands in the way', () =>
    expect(guards(result({ conditions: [unsolved] }))).toEqual(['not-converged']));
  test('a stop – stands in the way, a reason does not help', () => {
    const reasons = [{ rule: 'some-rule', ref: 'U1', condition: null, reason: 'We like it so.' }];
    expect(guards(result({ findings: [finding('stop')] }), reasons)).toEqual(['stop-finding']);
  });
  test('a warning – needs the reason of this very object', () => {
    const warned = result({ findings: [finding('warn', 'U1'), finding('warn', 'U2')] });
    const reasons = [{ rule: 'some-rule', ref: 'U1', condition: null, reason: 'Measured on the prototype.' }];
    expect(guards(warned)).toEqual(['reason-missing', 'reason-missing']);
    expect(guards(warned, reasons)).toEqual(['reason-missing']);
    expect(guards(warned, [...reasons, { ...reasons[0]!, ref: 'U2' }])).toEqual([]);
  });
});

describe('clearing', () => {
  const guards = (given: CheckResult | null, openComments = 0) =>
    codes(clearGuards({ result: given, reasons: [], openComments }));

  test('within and close – pass', () => {
    expect(guards(result())).toEqual([]);
    expect(guards(result({ verdict: 'close' }))).toEqual([]);
  });
  test('over – is not cleared', () => expect(guards(result({ verdict: 'over' }))).toEqual(['over-limit']));
  test('not evaluated – is never a pass', () =>
    expect(guards(result({ verdict: 'not evaluated' }))).toEqual(['not-evaluated']));
  test('an open stop, an unsolved condition and open comments – are all told at once', () =>
    expect(guards(result({ findings: [finding('stop')], conditions: [unsolved] }), 2)).toEqual([
      'stop-finding',
      'not-converged',
      'comments-open',
    ]));
  test('no result – stands in the way alone', () => expect(guards(null, 3)).toEqual(['result-missing']));
});
