import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import type { Regulator } from '#core/board/placement.ts';
import { addPart } from '#core/board/edits/add-part.ts';
import { addProbe } from '#core/board/edits/add-probe.ts';
import { addRegulator } from '#core/board/edits/add-regulator.ts';
import { addSink } from '#core/board/edits/add-sink.ts';
import { addSource } from '#core/board/edits/add-source.ts';
import { addViaField } from '#core/board/edits/add-via-field.ts';
import { type EditorState, type EditorStore, commit } from '../editor-store.ts';
import { freeId } from '#core/board/free-id.ts';
import { type ObjectKey, idOf, objectKey, objectKeys } from '#core/board/object-key.ts';
import { type PointerInput, idle } from './gesture.ts';
import type { Tool } from './tool.ts';
import type { ChosenPart } from './tool-name.ts';

/** Tools that put one object where the click ends: via field, regulator, heat source, sink, probe. */
export const placeTool: Tool = {
  press: (store, input) => store.setState({ gesture: { phase: 'placing', at: input.snapped } }),
  move(store, input) {
    if (store.getState().gesture.phase === 'placing') {
      store.setState({ gesture: { phase: 'placing', at: input.snapped } });
    }
  },
  release,
};

function release(store: EditorStore, input: PointerInput): void {
  const state = store.getState();
  if (state.gesture.phase !== 'placing') return;
  const placement = input.inside ? placementAt(state, input.snapped) : null;
  if (!placement) return store.setState({ gesture: idle });
  commit(store, placement.name, placement.edit);
  store.setState({ selection: [placement.key] });
}

type Placement = { name: string; key: ObjectKey; edit: (board: Board) => Board };

/** What a click at a point adds; null where something has to be chosen first. */
function placementAt(state: EditorState, at: Point): Placement | null {
  const { board, tool, toolSettings: settings, activeLayer } = state;
  const free = (prefix: string) => freeId(prefix, objectKeys(board).map(idOf));
  const copper = board.stackup.copper;
  switch (tool) {
    case 'via-field': {
      const id = free('v');
      const from = copper[0]?.name ?? activeLayer;
      const to = copper.at(-1)?.name ?? activeLayer;
      const field = { id, net: settings.net, at, rotationDeg: 0, from, to, ...settings.viaField };
      return {
        name: `Place via field ${id}`,
        key: objectKey('via-field', id),
        edit: (before) => addViaField(before, field),
      };
    }
    case 'regulator': {
      const { part } = settings;
      if (!part) return null;
      const regulator = newRegulator(board, part, free('U'), at, settings.side);
      return {
        name: `Place ${regulator.ref}`,
        key: objectKey('regulator', regulator.ref),
        edit: (before) => addRegulator(addPart(before, part.key, part.part, part.model), regulator),
      };
    }
    case 'source': {
      const ref = free('Q');
      const source = { ref, at, rotationDeg: 0, side: settings.side, bodyMm: null, limitC: null, ...settings.source };
      return { name: `Place ${ref}`, key: objectKey('source', ref), edit: (before) => addSource(before, source) };
    }
    case 'sink': {
      const id = free('s');
      const sink = { id, at, layer: activeLayer, ...settings.sink };
      return { name: `Place sink ${id}`, key: objectKey('sink', id), edit: (before) => addSink(before, sink) };
    }
    case 'probe': {
      const id = free('t');
      return {
        name: `Place probe ${id}`,
        key: objectKey('probe', id),
        edit: (before) => addProbe(before, { id, at, side: settings.side }),
      };
    }
    default:
      return null;
  }
}

/** A regulator fed from the first supply, its output on a net named after its voltage; all of it can be changed beside the canvas. */
function newRegulator(
  board: Board,
  { key, part }: ChosenPart,
  ref: string,
  at: Point,
  side: Regulator['side'],
): Regulator {
  const [supply] = board.supplies;
  return {
    ref,
    part: key,
    at,
    rotationDeg: 0,
    side,
    nets: { ground: 'GND', input: supply?.name ?? 'VIN', output: `${part.outputV}V` },
    feed: supply ? { supply: supply.name } : null,
    dropper: null,
    powerW: null,
  };
}
