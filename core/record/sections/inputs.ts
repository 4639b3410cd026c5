import type { Board } from '#core/board/document.ts';
import type { Part } from '#core/board/part.ts';
import type { Regulator } from '#core/board/placement.ts';
import { formatGiven } from '#core/format.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';
import { notStated, stated, statedTable } from '../stated.ts';

const passElements: Record<Part['passElement'], string> = {
  'npn-darlington': 'NPN Darlington',
  'npn-pnp': 'NPN driven by PNP',
  pnp: 'PNP',
  pmos: 'PMOS',
  nmos: 'NMOS',
};

/** What is taken of every regulator and every other source of heat, and where it comes from. */
export function inputsSection({ board }: RecordInput): RecordSection {
  return {
    id: 'inputs',
    title: 'Regulators and other sources of heat',
    blocks: [
      placements(board),
      ...partsUsed(board).flatMap(([key, part]) => partBlocks(key, part)),
      { kind: 'heading', text: 'Packages: thermal resistance from the junction, K/W' },
      packages(board),
      { kind: 'heading', text: 'Other sources of heat' },
      sources(board),
    ],
  };
}

function placements(board: Board): RecordBlock {
  return {
    kind: 'table',
    columns: [
      { title: 'Ref', weight: 0.8 },
      { title: 'Part', weight: 1.4 },
      { title: 'Centre mm', weight: 1.2, align: 'right' },
      { title: 'Side', weight: 0.8 },
      { title: 'Fed from', weight: 2.4 },
      { title: 'Nets: ground, input, output', weight: 2.4 },
      { title: 'Tab on', weight: 1.4 },
    ],
    rows: board.regulators.map((regulator) => [
      regulator.ref,
      board.parts[regulator.part]?.name ?? regulator.part,
      regulator.at.map((value) => formatGiven(value)).join(', '),
      regulator.side,
      feedText(regulator),
      [regulator.nets.ground, regulator.nets.input, regulator.nets.output].join(', '),
      tabText(board, regulator),
    ]),
    empty: 'The board has no regulator.',
  };
}

function feedText({ feed, dropper, powerW }: Regulator): string {
  if (powerW !== null) return `known dissipation ${formatGiven(powerW, 'W')}`;
  const from = !feed ? notStated : 'supply' in feed ? feed.supply : `output of ${feed.regulator}`;
  if (!dropper) return from;
  const drops = [
    dropper.resistanceOhm !== undefined && formatGiven(dropper.resistanceOhm, 'Ω'),
    dropper.dropV !== undefined && formatGiven(dropper.dropV, 'V'),
  ].filter(Boolean);
  return `${from} through ${drops.join(' and ')}${dropper.source ? ` (${dropper.source})` : ''}`;
}

function tabText(board: Board, regulator: Regulator): string {
  const part = board.parts[regulator.part];
  const tabs = (board.packages[part?.package ?? '']?.lands ?? []).filter(({ kind }) => kind === 'tab');
  const nets = tabs.map(({ name }) => {
    const pin = part?.landNets[name] ?? 'none';
    return pin === 'none' ? 'no net' : regulator.nets[pin];
  });
  return [...new Set(nets)].join(', ') || 'no tab';
}

function partsUsed(board: Board): [string, Part][] {
  const used = new Set(board.regulators.map(({ part }) => part));
  return Object.entries(board.parts).filter(([key]) => used.has(key));
}

function partBlocks(key: string, part: Part): RecordBlock[] {
  const limit = part.currentLimit;
  return [
    { kind: 'heading', text: `Part ${part.name}` },
    {
      kind: 'pairs',
      rows: [
        ...(part.name === key ? [] : [['Key in the document', key] as const]),
        ['Package, pass element', `${part.package}, ${passElements[part.passElement]}`],
        ['Output', `${stated(part.outputV, 'V')} ± ${stated(part.outputTolerancePct, '%')}`],
        ['Rated input, rated output', `${stated(part.inputMaxV, 'V')}, ${stated(part.outputMaxA, 'A')}`],
        ['Largest dropout', statedTable(part.dropoutV, 'V')],
        ['Ground current', statedTable(part.groundA, 'A')],
        [
          'Current limit',
          !limit
            ? notStated
            : limit.kind === 'constant'
              ? stated(limit.limitA, 'A')
              : `foldback from ${stated(limit.kneeA, 'A')} to ${stated(limit.shortA, 'A')} into a short`,
        ],
        [
          'Maker’s maximum junction, shutdown',
          `${stated(part.junctionMaxC, '°C')}, ${part.shutdownC === null ? `shutdown ${notStated}` : stated(part.shutdownC, '°C')}`,
        ],
        ['Source', part.source],
      ],
    },
  ];
}

function packages(board: Board): RecordBlock {
  const used = new Set(partsUsed(board).map(([, part]) => part.package));
  return {
    kind: 'table',
    columns: [
      { title: 'Package', weight: 1.2 },
      { title: 'Body mm', weight: 1.5, align: 'right' },
      { title: 'To its lands', weight: 2.2 },
      { title: 'To the case top', weight: 1, align: 'right' },
      { title: 'To the board under it', weight: 1.2, align: 'right' },
      { title: 'Source', weight: 3.4 },
    ],
    rows: Object.entries(board.packages)
      .filter(([key]) => used.has(key))
      .map(([, model]) => [
        model.name,
        model.bodyMm.map((value) => formatGiven(value)).join(' × '),
        model.lands.map(({ name, kPerW }) => `${name} ${formatGiven(kPerW)}`).join(', '),
        formatGiven(model.caseTopKPerW),
        model.underBodyKPerW === null ? 'no such path' : formatGiven(model.underBodyKPerW),
        model.source,
      ]),
    empty: 'No package is used.',
  };
}

function sources(board: Board): RecordBlock {
  return {
    kind: 'table',
    columns: [
      { title: 'Ref', weight: 1 },
      { title: 'Centre mm', weight: 1.2, align: 'right' },
      { title: 'Size mm', weight: 1.2, align: 'right' },
      { title: 'Side', weight: 0.8 },
      { title: 'Heat W', weight: 2.4 },
      { title: 'Limit °C', weight: 1, align: 'right' },
    ],
    rows: board.sources.map((source) => [
      source.ref,
      source.at.map((value) => formatGiven(value)).join(', '),
      source.sizeMm.map((value) => formatGiven(value)).join(' × '),
      source.side,
      source.powerW === null ? 'that of the droppers that name it' : formatGiven(source.powerW),
      stated(source.limitC),
    ]),
    empty: 'No other source of heat is on the board.',
  };
}
