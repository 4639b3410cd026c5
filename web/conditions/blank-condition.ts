import type { Condition } from '#core/board/condition.ts';

/** A new condition: room ambient, still air, nothing loaded yet. */
export function blankCondition(name: string): Condition {
  return {
    name,
    ambientC: 25,
    boxRiseK: 0,
    altitudeM: 0,
    orientation: 'horizontal',
    air: { kind: 'still' },
    filmWPerM2K: null,
    supplies: {},
    loadsA: {},
    powersW: {},
    fault: null,
  };
}
