import { describe, expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { findAll } from '#core/derating/find-all.ts';
import { contextOf } from './context-of.ts';
import { ringAt, soundBoard } from './sound-board.ts';

const found = (board: Board, solved?: Parameters<typeof contextOf>[1]) =>
  findAll(contextOf(board, solved)).map(({ severity, rule, ref }) => `${severity} ${rule} ${ref}`);

describe('findAll – what only the temperatures show', () => {
  const twice = (finding: string) => [finding, finding];

  test('laminate above its maximum operating temperature – warn; at it – nothing', () => {
    expect(found(soundBoard(), { maxC: 130.1 })).toEqual(twice('warn laminate-over null'));
    expect(found(soundBoard(), { maxC: 130 })).toEqual([]);
  });

  test('a regulator that reaches its shutdown – warn', () => {
    expect(found(soundBoard(), { regulators: [{ ref: 'U1', shutsDown: true }] })).toEqual(
      twice('warn shutdown-cycling U1'),
    );
  });

  test('little margin in a corner – note; the same margin in the middle – nothing', () => {
    const limit = { quantity: 'junctionC' as const, actual: 111, limit: 125, margin: 14, ratio: null, source: 'tests' };
    const tight = { regulators: [{ ref: 'U1', limits: [{ ...limit, verdict: 'within' as const }] }] };
    const cornered = soundBoard((document) => {
      document.regulators[0]!.at = [5, 5];
      document.pours[0]!.points = ringAt(5, 5);
    });
    expect(found(cornered, tight)).toEqual(['note near-corner U1']);
    expect(found(soundBoard(), tight)).toEqual([]);
  });

  test('heat that lies off the board – stop; a range left – note', () => {
    const notices = [
      { code: 'source-off-board', ref: 'R1', message: 'off' },
      { code: 'rise-range', ref: null, message: 'far' },
    ];
    expect(found(soundBoard(), { notices })).toEqual(['stop source-off-board R1', 'note rise-range null']);
  });

  test('a notice of one condition – named with it; of every condition – once, for all', () => {
    const context = contextOf(soundBoard());
    const general = { code: 'via-range', ref: 'v1', message: 'long' };
    const own = { code: 'slow-air', ref: null, message: 'slow' };
    const conditions = context.conditions.map((one, k) => ({ ...one, notices: k === 0 ? [general, own] : [general] }));
    expect(findAll({ ...context, conditions }).map(({ rule, condition }) => [rule, condition])).toEqual([
      ['via-range', null],
      ['slow-air', 'Hot'],
    ]);
  });
});
