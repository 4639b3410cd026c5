import { expect, test } from 'vitest';
import { fitted, panned, toBoard, toScreen, zoomedAt } from '#web/editor/camera.ts';
import { nudgeStep, rulerStep, snapped } from '#web/editor/grid.ts';

const view = { width: 873, height: 512 };
const camera = { centreMm: [17.5, -4.25] as [number, number], pxPerMm: 7.3 };

test('camera – board to screen and back – the same point; y up on the board is y down on the screen', () => {
  for (const point of [
    [0, 0],
    [100, 70],
    [-12.25, 3.125],
  ] as const) {
    const [x, y] = toBoard(camera, view, toScreen(camera, view, point));
    expect(x).toBeCloseTo(point[0], 10);
    expect(y).toBeCloseTo(point[1], 10);
  }
  expect(toScreen(camera, view, [17.5, 0])[1]).toBeLessThan(view.height / 2);
});

test('camera – zoomed at the pointer – the board point below it stays', () => {
  const at = [120, 400] as const;
  const before = toBoard(camera, view, at);
  const after = toBoard(zoomedAt(camera, view, at, 1.7), view, at);
  expect(after[0]).toBeCloseTo(before[0], 10);
  expect(after[1]).toBeCloseTo(before[1], 10);
});

test('camera – zoomed without end – stays between 0.5 and 200 px per mm', () => {
  expect(zoomedAt(camera, view, [0, 0], 1e9).pxPerMm).toBe(200);
  expect(zoomedAt(camera, view, [0, 0], 1e-9).pxPerMm).toBe(0.5);
});

test('camera – panned by pixels – a point moves by as many', () => {
  const moved = toScreen(panned(camera, 30, -12), view, [5, 5]);
  const still = toScreen(camera, view, [5, 5]);
  expect(moved[0] - still[0]).toBeCloseTo(30, 10);
  expect(moved[1] - still[1]).toBeCloseTo(-12, 10);
});

test('camera – fitted – all corners lie between the insets', () => {
  const corners = [
    [0, 0],
    [100, 0],
    [100, 70],
    [0, 70],
  ] as const;
  const insets = { left: 44, right: 22, top: 42, bottom: 48 };
  const fit = fitted(corners, view, insets);
  for (const corner of corners) {
    const [x, y] = toScreen(fit, view, corner);
    expect(x).toBeGreaterThanOrEqual(44 - 1e-9);
    expect(x).toBeLessThanOrEqual(view.width - 22 + 1e-9);
    expect(y).toBeGreaterThanOrEqual(42 - 1e-9);
    expect(y).toBeLessThanOrEqual(view.height - 48 + 1e-9);
  }
});

test('grid – steps that are no binary fractions – leave no dust', () => {
  expect(snapped([0.31, 2.99], 0.1)).toEqual([0.3, 3]);
  expect(Object.is(snapped([-0.01, 0], 0.1)[0], 0)).toBe(true);
});

test('grid – step of the arrow keys – grid, ten times, a tenth of a millimetre', () => {
  expect(nudgeStep(0.5, { shift: false, alt: false })).toBe(0.5);
  expect(nudgeStep(0.5, { shift: true, alt: false })).toBe(5);
  expect(nudgeStep(0.5, { shift: false, alt: true })).toBe(0.1);
});

test('ruler – figures – 1, 2 or 5 times a power of ten, at least 60 px apart', () => {
  // 60 px ÷ 7.3 px/mm = 8.2 mm → 10 mm; 60 ÷ 40 = 1.5 → 2; 60 ÷ 150 = 0.4 → 0.5.
  expect([rulerStep(7.3), rulerStep(40), rulerStep(150)]).toEqual([10, 2, 0.5]);
});
