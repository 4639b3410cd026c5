import type { Sink, ViaField } from '#core/board/copper.ts';
import type { PackageModel } from '#core/board/package.ts';
import type { Part } from '#core/board/part.ts';
import type { HeatSource, Side } from '#core/board/placement.ts';

export const toolNames = [
  'select',
  'hand',
  'outline',
  'pour',
  'cutout',
  'via-field',
  'regulator',
  'source',
  'sink',
  'probe',
] as const;
export type ToolName = (typeof toolNames)[number];

/** A part of the library that is about to be placed, with its package. */
export type ChosenPart = { key: string; part: Part; model: PackageModel };

/** What the next drawn or placed object starts from; shown and changed beside the tools. */
export type ToolSettings = {
  /** How outline, pour and cut-out are drawn. */
  shape: 'rectangle' | 'polygon';
  /** Net of the next pour or via field. */
  net: string;
  part: ChosenPart | null;
  /** Face for the next part, heat source or probe. */
  side: Side;
  viaField: Pick<ViaField, 'columns' | 'rows' | 'pitchMm' | 'drillMm' | 'platingUm' | 'filling'>;
  source: Pick<HeatSource, 'sizeMm' | 'powerW'>;
  sink: Pick<Sink, 'sizeMm' | 'conductanceWPerK' | 'toC'>;
};

export const firstSettings: ToolSettings = {
  shape: 'rectangle',
  net: 'GND',
  part: null,
  side: 'top',
  viaField: { columns: 3, rows: 3, pitchMm: 1.2, drillMm: 0.3, platingUm: 25, filling: 'open' },
  source: { sizeMm: [5, 5], powerW: 0.25 },
  sink: { sizeMm: [6, 6], conductanceWPerK: 0.2, toC: 'ambient' },
};

export const toolWords: Record<ToolName, { label: string; key: string; hint: string }> = {
  select: {
    label: 'Select',
    key: 'v',
    hint: 'Click to select, drag to move. Shift adds. M picks up the selection for a move by two clicks.',
  },
  hand: { label: 'Hand', key: 'h', hint: 'Drag to move the picture. The wheel zooms at the pointer.' },
  outline: { label: 'Outline', key: 'o', hint: 'Draw the edge of the board; it takes the place of the present one.' },
  pour: { label: 'Pour', key: 'p', hint: 'Draw copper of one net on the active layer.' },
  cutout: {
    label: 'Cut-out',
    key: 'c',
    hint: 'Draw a hole in the board; with one pour selected, a hole in that pour.',
  },
  'via-field': { label: 'Via field', key: 'f', hint: 'Click the middle of a grid of vias.' },
  regulator: { label: 'Regulator', key: 'u', hint: 'Choose a part, then click where its middle goes.' },
  source: { label: 'Heat source', key: 's', hint: 'Click the middle of a part that gives off a known power.' },
  sink: { label: 'Sink', key: 'k', hint: 'Click the middle of a screw, a clip or a chassis contact.' },
  probe: { label: 'Probe', key: 't', hint: 'Click where a temperature is to be read.' },
};

/** Tools that draw a ring of corners. */
export function drawsShape(tool: ToolName): tool is 'outline' | 'pour' | 'cutout' {
  return tool === 'outline' || tool === 'pour' || tool === 'cutout';
}
