import { describe, expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { moveObjects } from '#core/board/edits/move-objects.ts';
import { guideLines } from '#web/editor/snap/guide-lines.ts';
import { neighbourGaps } from '#web/editor/snap/neighbour-gaps.ts';
import { linesOf, snapLines } from '#web/editor/snap/snap-lines.ts';
import { snapPoint, snapShift } from '#web/editor/snap/snap-shift.ts';
import { smallDocument } from '#test/core/board/small-board.ts';
import { driveEditor } from '../editor-driver.ts';

// The regulator's body is 4 × 4 mm around (10, 10), its land 3 × 3 mm; the board is 40 × 30 mm; p1 spans 5…15 mm.
const board = boardDocument.parse(smallDocument);

describe('lines that draw', () => {
  test('a regulator – edges, centre and its land’s edges, in x and y', () => {
    const xs = linesOf(board, 'regulator:U1')
      .filter((line) => line.axis === 0)
      .map((line) => line.at);
    expect([...new Set(xs)].sort((a, b) => a - b)).toEqual([8, 8.5, 10, 11.5, 12]);
  });

  test('what is moved – offers no lines to itself', () => {
    expect(snapLines(board, ['pour:p1']).some((line) => line.key === 'pour:p1')).toBe(false);
    expect(snapLines(board, []).some((line) => line.key === 'pour:p1')).toBe(true);
  });

  test('two lines within reach – the nearer one, each axis for itself; beyond it – none', () => {
    const lines = linesOf(board, 'pour:p1').filter((line) => line.axis === 0);
    const [near, none] = snapShift([{ axis: 0, at: 14.4 }], lines, 0.8);
    expect(near).toBeCloseTo(0.6, 12);
    expect(none).toBeNull();
    expect(snapShift([{ axis: 0, at: 13 }], lines, 0.8)).toEqual([null, null]);
  });

  test('a point near a line in x only – on the line in x, on the grid in y', () => {
    const lines = linesOf(board, 'pour:p2');
    const whole = ([x, y]: readonly [number, number]): [number, number] => [Math.round(x), Math.round(y)];
    expect(snapPoint([37.7, 20.4], lines, 0.8, whole)).toEqual([38, 20]);
  });
});

describe('guides and distances', () => {
  test('a regulator whose centre lies at the middle of the other pour – one guide through both', () => {
    const moved = moveObjects(board, ['regulator:U1'], [19, 12]);
    const guides = guideLines(linesOf(moved, 'regulator:U1'), linesOf(moved, 'pour:p2'));
    // p2 spans x 20…38 (middle 29), y 2…12; U1's body now y 20…24.
    expect(guides).toEqual([{ axis: 0, at: 29, from: 2, to: 24 }]);
  });

  test('a regulator alone to its left and below – distances to the board’s edge', () => {
    const gaps = neighbourGaps({ ...board, sources: [] }, ['regulator:U1']);
    expect(gaps.map((gap) => gap.mm)).toEqual([8, 28, 8, 18]);
  });

  test('a heat source in the way – the distance ends at it', () => {
    const [source] = board.sources;
    if (!source) throw new Error('the small board has a heat source');
    const beside = {
      ...board,
      sources: [{ ...source, at: [20, 10] as [number, number], sizeMm: [4, 4] as [number, number], rotationDeg: 0 }],
    };
    expect(neighbourGaps(beside, ['regulator:U1']).map((gap) => gap.mm)).toEqual([8, 6, 8, 18]);
  });
});

describe('select tool with object snapping', () => {
  test('a drag that ends near the edge of a pour – the land’s edge lies on it, off the grid', () => {
    const hand = driveEditor(null, true);
    // The land reaches 1.5 mm left of the centre, so its edge comes to 20.1; p2 begins at 20. The grid alone would give 22.
    hand.drag([10, 10], [21.6, 26.4]);
    expect(hand.board().regulators[0]?.at[0]).toBe(21.5);
  });

  test('the same drag with Alt – the exact distance', () => {
    const hand = driveEditor(null, true);
    hand.drag([10, 10], [21.6, 26.4], { alt: true });
    expect(hand.board().regulators[0]?.at).toEqual([21.6, 26.4]);
  });

  test('a corner of a pour dragged near the board’s edge – on the edge, not on its own old place', () => {
    const hand = driveEditor(null, true);
    hand.store.setState({ selection: ['pour:p1'] });
    hand.drag([5, 5], [0.3, 5.3]);
    expect(hand.board().pours[0]?.points[0]?.[0]).toBe(0);
  });
});
