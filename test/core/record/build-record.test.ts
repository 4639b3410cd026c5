import { expect, test } from 'vitest';
import { buildRecord } from '#core/record/build-record.ts';
import { formatTime } from '#core/record/format-time.ts';
import { deference, notCovered } from '#core/record/method-limits.ts';
import type { RecordDocument } from '#core/record/record-document.ts';
import {
  sampleCondition,
  sampleLimit,
  sampleRecord,
  sampleRegulator,
  sampleResult,
  sampleRevision,
} from './record-sample.ts';

/** Everything that the record says in one section, as one text. */
function wordsOf(record: RecordDocument, id: string): string {
  const section = record.sections.find((candidate) => candidate.id === id);
  return JSON.stringify(section?.blocks.filter(({ kind }) => kind !== 'heat' && kind !== 'copper') ?? null);
}

test('record – sections – in the order in which a reviewer reads', () => {
  expect(buildRecord(sampleRecord()).sections.map(({ id }) => id)).toEqual(
    'summary scope conditions stackup inputs limits results ladders ledger heat neighbours findings cautions assumptions method signatures'.split(
      ' ',
    ),
  );
});

test('record – every exceedance of every condition – listed by name, with its excess and as a notice, not a caution', () => {
  const hot = sampleRegulator('U1', { limits: [sampleLimit('junctionC', 121, 110, 'over')], verdict: 'over' });
  const surge = sampleRegulator('U1', { limits: [sampleLimit('inputV', 17.25, 16, 'over')], verdict: 'over' });
  const conditions = [sampleCondition('Hot', [hot]), sampleCondition('Surge', [surge])];
  const record = buildRecord(sampleRecord({ result: sampleResult(conditions, { verdict: 'over', cautions: [] }) }));
  const summary = wordsOf(record, 'summary');
  // 121 − 110 K and 17.25 − 16 V.
  expect(summary).toContain('"U1","Hot","Junction","121.0\u00a0°C","110.0\u00a0°C","11.0\u00a0K"');
  expect(summary).toContain('"U1","Surge","Input voltage","17.25\u00a0V","16.00\u00a0V","1.25\u00a0V"');
  expect(summary).toContain('"kind":"notice"');
  expect(wordsOf(record, 'cautions')).not.toContain('"kind":"caution"');
});

test('record – laminate hotter than its maximum operating temperature – an exceedance, whatever the regulators say', () => {
  // The small board states 130 °C.
  const board = { maxC: 141.5, maxAt: [30, 22] as [number, number], meanC: 70 };
  const condition = sampleCondition('Hot', [sampleRegulator('U1', {})], { board });
  const summary = wordsOf(buildRecord(sampleRecord({ result: sampleResult([condition]) })), 'summary');
  expect(summary).toContain('"Laminate","Hot","Hottest place","141.5\u00a0°C","130.0\u00a0°C","11.5\u00a0K"');
});

test('record – values that could not be evaluated – open points name them, and nothing prints NaN, null or undefined', () => {
  const open = sampleRegulator('U1', {
    dissipationW: null,
    junctionC: null,
    uncertaintyK: null,
    gridErrorK: null,
    modelErrorK: null,
    caseTopC: null,
    landC: null,
    thetaJaKPerW: null,
    inputV: null,
    outputV: null,
    outputA: null,
    groundA: null,
    headroomV: null,
    regulating: null,
    ladderK: null,
    limits: [sampleLimit('junctionC', null, 110, 'not evaluated'), sampleLimit('inputV', null, 16, 'not evaluated')],
    verdict: 'not evaluated',
  });
  const failed = {
    status: 'not-converged',
    message: 'The films did not settle.',
    sources: [],
    ledger: [],
    board: null,
    energy: null,
    solver: null,
    verdict: 'not evaluated',
  } as const;
  const conditions = [
    sampleCondition('Hot', [open]),
    sampleCondition('Cold', [open], { ...failed, sources: [], ledger: [] }),
  ];
  const record = buildRecord(sampleRecord({ result: sampleResult(conditions, { verdict: 'not evaluated' }) }));
  const scope = wordsOf(record, 'scope');
  expect(scope).toContain('U1 in “Hot”: junction temperature, input voltage not evaluated.');
  expect(scope).toContain('Condition “Cold” has no converged solution: The films did not settle.');
  const all = record.sections.map(({ id }) => wordsOf(record, id)).join(' ');
  expect(all).not.toMatch(/NaN|undefined|Infinity|\bnull\b/);
});

test('record – a condition of the document left out of the check – is an open point', () => {
  // The small board has the conditions Hot and Cold; only Hot was checked.
  expect(wordsOf(buildRecord(sampleRecord()), 'scope')).toContain(
    'Condition “Cold” is in the document but was not checked.',
  );
});

test('record – every limit – carries its rule and the rule its source', () => {
  const record = buildRecord(sampleRecord());
  expect(wordsOf(record, 'limits')).toContain('"R2","Input voltage","stress ratio at most 0.8"');
  expect(wordsOf(record, 'limits')).toContain('Sample rules, clause 4.2');
  expect(wordsOf(record, 'results')).toContain(
    '"U1","R2","Input voltage","20.00\u00a0V","14.00\u00a0V","16.00\u00a0V"',
  );
});

test('record – the reason given for a warning – stands beside its finding', () => {
  expect(wordsOf(buildRecord(sampleRecord()), 'findings')).toContain('The corner is clamped to the frame.');
});

test('record – a document without a revision – is not issued and signed by nobody', () => {
  const record = buildRecord(sampleRecord({ revision: null }));
  expect(record.header).toMatchObject({ state: 'document', letter: null, changedAt: null });
  expect(wordsOf(record, 'signatures')).toContain('belongs to no revision and nobody has signed it');
});

test('record – signatures – name, meaning and time with its offset from UTC', () => {
  const words = wordsOf(buildRecord(sampleRecord()), 'signatures');
  expect(words).toContain('"Rolf Reviewer","Review: reviewed and cleared","2031-03-04 09:03:04 +00:00"');
});

test('record – method section – holds the standing text of what is not covered and of what takes precedence', () => {
  const words = wordsOf(buildRecord(sampleRecord()), 'method');
  for (const text of [...notCovered, ...deference]) expect(words).toContain(text);
  // 4.2 K of the rise over the local air of 6.1 + 28.2 + 3.1 = 37.4 K.
  expect(words).toContain('11 %');
});

test('digest – the same content solved again in other time – the same; another signature – another', () => {
  const digestOf = (record: RecordDocument) => record.header.digest;
  const condition = sampleCondition('Hot', [sampleRegulator('U1', {})]);
  const again = { ...condition, solver: { ...condition.solver!, milliseconds: 977 } };
  const first = digestOf(buildRecord(sampleRecord({ result: sampleResult([condition]) })));
  expect(first).toMatch(/^sha256:[0-9a-f]{64}$/);
  expect(digestOf(buildRecord(sampleRecord({ result: sampleResult([again]) })))).toBe(first);
  const unsigned = sampleRevision('issued', { signatures: [] });
  expect(digestOf(buildRecord(sampleRecord({ result: sampleResult([condition]), revision: unsigned })))).not.toBe(
    first,
  );
});

test('time – given with another offset – the same moment in UTC', () => {
  expect(formatTime('2031-03-05T01:30:00+02:00')).toBe('2031-03-04 23:30:00 +00:00');
});
