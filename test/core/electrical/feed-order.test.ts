import { expect, test } from 'vitest';
import { atCurrent } from '#core/electrical/current-table.ts';
import { feedCycle, orderByFeed } from '#core/electrical/feed-order.ts';

const fed = (ref: string, by: string | null) => ({ ref, feed: by === null ? { supply: 'VIN' } : { regulator: by } });

test('orderByFeed – a tree written from its leaves – each after the one that feeds it', () => {
  const order = orderByFeed([fed('U4', 'U2'), fed('U3', 'U1'), fed('U2', 'U1'), fed('U1', null)]).map(({ ref }) => ref);
  for (const [below, above] of [['U4', 'U2'] as const, ['U3', 'U1'] as const, ['U2', 'U1'] as const]) {
    expect(order.indexOf(below)).toBeGreaterThan(order.indexOf(above));
  }
});

test('feedCycle – a tree – none; a circle below a healthy one – only the circle', () => {
  expect(feedCycle([fed('U1', null), fed('U2', 'U1')])).toBeNull();
  expect(feedCycle([fed('U1', null), fed('U5', 'U2'), fed('U2', 'U3'), fed('U3', 'U2')])).toEqual(['U2', 'U3']);
});

test('atCurrent – before, on, between and after the points – constant outside, straight inside', () => {
  const table: [number, number][] = [
    [0.1, 1],
    [0.5, 2],
  ];
  expect([0, 0.1, 0.2, 0.5, 3].map((current) => atCurrent(table, current))).toEqual([1, 1, 1.25, 2, 2]);
});
