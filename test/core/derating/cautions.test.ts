import { describe, expect, test } from 'vitest';
import { burnTime } from '#core/derating/burn-threshold.ts';
import { cautionsOf } from '#core/derating/cautions.ts';
import { smallBoard } from '../board/small-board.ts';
import { contextOf } from './context-of.ts';

const kinds = (solved: Parameters<typeof contextOf>[1]) =>
  cautionsOf(contextOf(smallBoard, solved)).map(({ kind, ref }) => `${kind} ${ref}`);

test('cautionsOf – a cool board – the standing caution alone: burns and fire, local codes, licensed judgement', () => {
  const [only, ...more] = cautionsOf(contextOf(smallBoard));
  expect(more).toEqual([]);
  expect(only!.kind).toBe('general');
  for (const word of ['burn', 'fire', 'codes', 'licensed']) expect(only!.message).toContain(word);
});

test('cautionsOf – an exceedance without a hazard – no caution for it', () => {
  const over = { ref: 'U1', junctionC: 140, verdict: 'over' as const, landC: 40, caseTopC: 41 };
  expect(kinds({ regulators: [over] })).toEqual(['general null']);
});

test('cautionsOf – a hot part – temperature, contact time, material, threshold and source of its hottest condition', () => {
  const [hot] = cautionsOf(contextOf(smallBoard, { regulators: [{ ref: 'U1', landC: 66.4, caseTopC: 91.2 }] }));
  expect(hot).toMatchObject({ kind: 'hot-surface', ref: 'U1', condition: 'Hot' });
  expect(hot!.message).toContain('bare metal at 66 °C burns skin within a second and a half (from 66 °C on)');
  expect(hot!.message).toContain('plastic case at 91 °C within a second and a half (from 91 °C on)');
  expect(hot!.message).toContain('burn-institute figures');
});

test('cautionsOf – a hot resistor, a hot laminate, a neighbour over its limit – one each', () => {
  expect(
    kinds({ maxC: 131, sources: [{ ref: 'R1', maxC: 120, temperatureC: 118, limitC: 100, verdict: 'over' }] }),
  ).toEqual(['hot-surface R1', 'laminate null', 'laminate null', 'neighbour R1', 'neighbour R1', 'general null']);
});

describe('burnTime – the table of contact times – each row from its threshold on', () => {
  // Contact time to a serious burn, metal / glass / plastic, as quoted on the emc-pstc list (message 05244).
  test.each([
    ['one second', 68, 78, 93],
    ['ten seconds', 57, 67, 82],
    ['half a minute', 55, 65, 80],
    ['some minutes', 49, 59, 74],
  ])('%s', (time, metal, glass, plastic) => {
    expect(burnTime('metal', metal)?.time).toBe(time);
    expect(burnTime('glass', glass)?.time).toBe(time);
    expect(burnTime('plastic', plastic)?.time).toBe(time);
    expect(burnTime('metal', metal - 0.1)?.time).not.toBe(time);
  });

  test('below every threshold – none', () => expect(burnTime('metal', 48.9)).toBeNull());
});
