import type { Board } from '#core/board/document.ts';
import type { Point, Ring } from '#core/board/outline.ts';
import { bodyRing, landRings, rectangleRing, viaFieldRing } from './footprint.ts';
import { type ObjectKey, idOf, kindOf } from './object-key.ts';

/** Half the side of the square that stands for a probe, mm. */
const probeReachMm = 0.6;

/** Outlines of an object on the board, mm; empty when it is gone. Serves drawing, hitting and fitting alike. */
export function objectRings(board: Board, key: ObjectKey): Ring[] {
  const id = idOf(key);
  switch (kindOf(key)) {
    case 'regulator': {
      const regulator = board.regulators.find((candidate) => candidate.ref === id);
      if (!regulator) return [];
      const body = bodyRing(board, regulator);
      const lands = landRings(board, regulator).map((land) => land.ring);
      return body ? [body, ...lands] : [rectangleRing(regulator.at, [2, 2], 0)];
    }
    case 'source': {
      const source = board.sources.find((candidate) => candidate.ref === id);
      return source ? [rectangleRing(source.at, source.sizeMm, source.rotationDeg)] : [];
    }
    case 'pour': {
      const pour = board.pours.find((candidate) => candidate.id === id);
      return pour ? [pour.points, ...pour.holes] : [];
    }
    case 'via-field': {
      const field = board.viaFields.find((candidate) => candidate.id === id);
      return field ? [viaFieldRing(field)] : [];
    }
    case 'sink': {
      const sink = board.sinks.find((candidate) => candidate.id === id);
      return sink ? [rectangleRing(sink.at, sink.sizeMm, 0)] : [];
    }
    case 'probe': {
      const probe = board.probes.find((candidate) => candidate.id === id);
      return probe ? [rectangleRing(probe.at, [2 * probeReachMm, 2 * probeReachMm], 0)] : [];
    }
    case 'cutout': {
      const ring = board.outline.cutouts[Number(id)];
      return ring ? [ring] : [];
    }
    case 'outline':
      return [board.outline.points];
  }
}

/** Corners of an object that is a polygon, as they may be moved one by one; null for the others. */
export function cornersOf(board: Board, key: ObjectKey): Ring | null {
  const kind = kindOf(key);
  return kind === 'pour' || kind === 'cutout' || kind === 'outline' ? (objectRings(board, key)[0] ?? null) : null;
}

/** Reference point of an object: where it was placed, or the middle of its box. */
export function positionOf(board: Board, key: ObjectKey): Point | null {
  const id = idOf(key);
  const placed =
    board.regulators.find((item) => key === `regulator:${item.ref}`) ??
    board.sources.find((item) => key === `source:${item.ref}`) ??
    board.viaFields.find((item) => key === `via-field:${item.id}`) ??
    board.sinks.find((item) => key === `sink:${item.id}`) ??
    board.probes.find((item) => key === `probe:${item.id}`);
  if (placed) return placed.at;
  const box = boxOf(objectRings(board, `${kindOf(key)}:${id}`));
  return box && [(box.left + box.right) / 2, (box.bottom + box.top) / 2];
}

export type Box = { left: number; right: number; bottom: number; top: number };

/** Box around rings, mm; null when there are none. */
export function boxOf(rings: readonly Ring[]): Box | null {
  const points = rings.flat();
  if (points.length === 0) return null;
  const box = { left: Infinity, right: -Infinity, bottom: Infinity, top: -Infinity };
  for (const [x, y] of points) {
    box.left = Math.min(box.left, x);
    box.right = Math.max(box.right, x);
    box.bottom = Math.min(box.bottom, y);
    box.top = Math.max(box.top, y);
  }
  return box;
}
