import { describe, expect, test } from 'vitest';
import { shownBoard } from '#web/editor/editor-store.ts';
import { pickUp } from '#web/editor/tools/select-tool.ts';
import { driveEditor } from './editor-driver.ts';

describe('select tool', () => {
  test('a drag of a regulator – one step, on the grid, however many moves it had', () => {
    const hand = driveEditor();
    hand.drag([10.3, 10.2], [24.6, 19.9]);
    // Moved by 14.3 and 9.7 mm; the reference point lands on the 1 mm grid at 24 and 20.
    expect(hand.board().regulators[0]?.at).toEqual([24, 20]);
    expect(hand.steps()).toEqual(['Move U1']);
  });

  test('a drag with Alt – the exact distance, without the grid', () => {
    const hand = driveEditor();
    hand.drag([10, 10], [12.34, 10.5], { alt: true });
    expect(hand.board().regulators[0]?.at).toEqual([12.34, 10.5]);
  });

  test('Escape during a drag – nothing has happened, and the shown board is the old one', () => {
    const hand = driveEditor();
    const before = hand.board();
    hand.press([10, 10]);
    hand.move([20, 20]);
    expect(shownBoard(hand.store.getState()).regulators[0]?.at).toEqual([20, 20]);
    hand.escape();
    hand.release([20, 20]);
    expect(hand.board()).toBe(before);
    expect(shownBoard(hand.store.getState())).toBe(before);
  });

  test('a drag that is released off the canvas – nothing has happened', () => {
    const hand = driveEditor();
    const before = hand.board();
    hand.press([10, 10]);
    hand.move([30, 20]);
    hand.release([-500, 20]);
    expect(hand.board()).toBe(before);
    expect(hand.phase()).toBe('idle');
  });

  test('a press alone – neither selects nor moves', () => {
    const hand = driveEditor();
    hand.press([10, 10]);
    expect(hand.selection()).toEqual([]);
    expect(hand.steps()).toEqual([]);
  });

  test('click, Shift click, Shift click again – selects, adds, takes away', () => {
    const hand = driveEditor();
    hand.click([10, 10]);
    hand.click([30, 22], { shift: true });
    expect(hand.selection()).toEqual(['regulator:U1', 'source:R1']);
    hand.click([10, 10], { shift: true });
    expect(hand.selection()).toEqual(['source:R1']);
    hand.click([18, 28]);
    expect(hand.selection()).toEqual([]);
  });

  test('a marquee around the left half – takes what lies wholly inside, never the outline', () => {
    const hand = driveEditor();
    hand.drag([2, 28], [18, 2]);
    expect(hand.selection()).toEqual(['regulator:U1', 'pour:p1']);
  });

  test('several selected – move together, in one step', () => {
    const hand = driveEditor();
    hand.drag([2, 28], [18, 2]);
    hand.drag([10, 10], [15, 12]);
    expect(hand.board().regulators[0]?.at).toEqual([15, 12]);
    expect(hand.board().pours[0]?.points[0]).toEqual([10, 7]);
    expect(hand.steps()).toEqual(['Move 2 objects']);
  });

  test('picked up, moved without a button, clicked – put down there in one step', () => {
    const hand = driveEditor();
    hand.click([10, 10]);
    hand.store.setState({ pointer: [10, 10] });
    pickUp(hand.store);
    hand.move([20, 18]);
    expect(hand.steps()).toEqual([]);
    hand.click([20, 18]);
    expect(hand.board().regulators[0]?.at).toEqual([20, 18]);
    expect(hand.steps()).toEqual(['Move U1']);
  });

  test('a corner of the selected pour – dragged alone; clicked – carried to the next click', () => {
    const hand = driveEditor();
    hand.click([6, 6]);
    expect(hand.selection()).toEqual(['pour:p1']);
    hand.drag([15, 15], [18, 17]);
    expect(hand.board().pours[0]?.points).toEqual([
      [5, 5],
      [15, 5],
      [18, 17],
      [5, 15],
    ]);
    hand.click([5, 5]);
    hand.move([4, 4]);
    hand.click([3, 4]);
    expect(hand.board().pours[0]?.points[0]).toEqual([3, 4]);
  });

  test('of two layers – the click takes the pour of the active one, elsewhere the other', () => {
    const hand = driveEditor();
    hand.click([30, 7]);
    expect(hand.selection()).toEqual(['pour:p2']);
  });

  test('a read-only sketch – selects, but a drag spans a marquee and moves nothing', () => {
    const hand = driveEditor('The revision is issued.');
    const before = hand.board();
    hand.click([10, 10]);
    expect(hand.selection()).toEqual(['regulator:U1']);
    hand.drag([10, 10], [20, 20]);
    expect(hand.board()).toBe(before);
  });
});

describe('shape tool', () => {
  test('rectangle by a drag – a pour on the active layer and the chosen net, selected', () => {
    const hand = driveEditor();
    hand.store.setState(({ toolSettings }) => ({ tool: 'pour', toolSettings: { ...toolSettings, net: '5V' } }));
    hand.drag([20.2, 18.4], [33.7, 27.1]);
    expect(hand.board().pours[2]).toEqual({
      id: 'p3',
      layer: 'L1',
      net: '5V',
      points: [
        [20, 18],
        [34, 18],
        [34, 27],
        [20, 27],
      ],
      holes: [],
      coverage: 1,
      emissivity: null,
    });
    expect(hand.selection()).toEqual(['pour:p3']);
    expect(hand.steps()).toEqual(['Draw pour p3']);
  });

  test('rectangle by two clicks – the same pour without a drag', () => {
    const hand = driveEditor();
    hand.tool('pour');
    hand.click([20, 18]);
    expect(hand.steps()).toEqual([]);
    hand.move([30, 22]);
    hand.click([34, 27]);
    expect(hand.board().pours[2]?.points).toEqual([
      [20, 18],
      [34, 18],
      [34, 27],
      [20, 27],
    ]);
  });

  test('polygon – closed by a click on its first corner', () => {
    const hand = driveEditor();
    hand.store.setState(({ toolSettings }) => ({
      tool: 'outline',
      toolSettings: { ...toolSettings, shape: 'polygon' },
    }));
    for (const corner of [
      [0, 0],
      [50, 0],
      [50, 35],
      [20, 35],
    ] as const)
      hand.click(corner);
    expect(hand.phase()).toBe('polygon');
    hand.click([0.4, 0.3]);
    expect(hand.board().outline.points).toEqual([
      [0, 0],
      [50, 0],
      [50, 35],
      [20, 35],
    ]);
    expect(hand.steps()).toEqual(['Draw the outline']);
  });

  test('polygon – with two corners only – does not close; Escape leaves no trace', () => {
    const hand = driveEditor();
    hand.store.setState(({ toolSettings }) => ({ tool: 'pour', toolSettings: { ...toolSettings, shape: 'polygon' } }));
    hand.click([20, 20]);
    hand.click([30, 20]);
    hand.finish();
    expect(hand.phase()).toBe('polygon');
    hand.escape();
    expect(hand.phase()).toBe('idle');
    expect(hand.steps()).toEqual([]);
  });

  test('cut-out – in the board; with one pour selected – a hole in that pour', () => {
    const hand = driveEditor();
    hand.tool('cutout');
    hand.drag([36, 26], [38, 28]);
    expect(hand.board().outline.cutouts).toEqual([
      [
        [36, 26],
        [38, 26],
        [38, 28],
        [36, 28],
      ],
    ]);
    hand.store.setState({ selection: ['pour:p1'] });
    hand.drag([6, 6], [8, 8]);
    expect(hand.board().pours[0]?.holes).toEqual([
      [
        [6, 6],
        [8, 6],
        [8, 8],
        [6, 8],
      ],
    ]);
  });

  test('keys alone – arrows move the crosshair, Enter sets both corners of a pour', () => {
    const hand = driveEditor();
    hand.tool('pour');
    hand.crosshair('ArrowLeft'); // appears in the middle of the picture: 20, 15
    hand.enter();
    hand.crosshair('ArrowRight', { shift: true });
    hand.crosshair('ArrowUp', { shift: true });
    hand.crosshair('ArrowUp', { alt: true });
    hand.enter();
    expect(hand.board().pours[2]?.points).toEqual([
      [20, 15],
      [30, 15],
      [30, 25.1],
      [20, 25.1],
    ]);
  });
});

describe('place tool', () => {
  test('regulator – its part and package come along into the document, once', () => {
    const hand = driveEditor();
    const { five } = hand.board().parts;
    const { box } = hand.board().packages;
    if (!five || !box) throw new Error('the small board has lost its part');
    const part = { ...five, name: 'THREE', package: 'box3', outputV: 3 };
    hand.store.setState(({ toolSettings }) => ({
      tool: 'regulator',
      toolSettings: { ...toolSettings, part: { key: 'three', part, model: { ...box, name: 'Box 3' } } },
    }));
    hand.click([30, 10]);
    hand.click([35, 20]);
    expect(Object.keys(hand.board().parts)).toEqual(['five', 'three']);
    expect(Object.keys(hand.board().packages)).toEqual(['box', 'box3']);
    expect(hand.board().regulators.map(({ ref, at, part: key }) => [ref, key, ...at])).toEqual([
      ['U1', 'five', 10, 10],
      ['U2', 'three', 30, 10],
      ['U3', 'three', 35, 20],
    ]);
    hand.undo();
    hand.undo();
    expect(Object.keys(hand.board().parts)).toEqual(['five']);
  });

  test('regulator – with no part chosen – places nothing', () => {
    const hand = driveEditor();
    hand.tool('regulator');
    hand.click([30, 10]);
    expect(hand.steps()).toEqual([]);
  });

  test('press, then release off the canvas – nothing is placed', () => {
    const hand = driveEditor();
    hand.tool('source');
    hand.press([30, 10]);
    hand.release([30, -500]);
    expect(hand.board().sources).toHaveLength(1);
  });
});

describe('nudge', () => {
  test('arrows – one grid step; Shift – ten; Alt – 0.1 mm', () => {
    const hand = driveEditor();
    hand.click([10, 10]);
    hand.nudge('ArrowRight');
    hand.nudge('ArrowUp', { shift: true });
    hand.nudge('ArrowLeft', { alt: true });
    expect(hand.board().regulators[0]?.at).toEqual([10.9, 20]);
  });
});
