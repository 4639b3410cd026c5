import { feedCycle } from '#core/electrical/feed-order.ts';
import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';
import { shown } from '../quantity.ts';

/** Supplies in order, feeds and droppers that exist and run in no circle, conditions that name what exists. */
export function checkElectrical(board: Board, report: Report) {
  const supplies = new Set(board.supplies.map((supply) => supply.name));
  const regulators = new Set(board.regulators.map((regulator) => regulator.ref));
  const sources = new Set(board.sources.map((source) => source.ref));
  board.supplies.forEach((supply, i) => {
    if (supply.minV > supply.nominalV)
      report(['supplies', i, 'minV'], `must be at most nominalV (${supply.nominalV} V), found ${supply.minV} V`);
    if (supply.maxV < supply.nominalV)
      report(['supplies', i, 'maxV'], `must be at least nominalV (${supply.nominalV} V), found ${supply.maxV} V`);
  });
  board.regulators.forEach((regulator, i) => {
    const { feed, dropper } = regulator;
    if (feed && 'supply' in feed && !supplies.has(feed.supply)) {
      report(['regulators', i, 'feed', 'supply'], `must be a supply of this document, found ${shown(feed.supply)}`);
    }
    if (feed && 'regulator' in feed && !regulators.has(feed.regulator)) {
      report(
        ['regulators', i, 'feed', 'regulator'],
        `must be a regulator of this document, found ${shown(feed.regulator)}`,
      );
    }
    if (dropper?.source !== undefined && !sources.has(dropper.source)) {
      report(
        ['regulators', i, 'dropper', 'source'],
        `must be a heat source of this document, found ${shown(dropper.source)}`,
      );
    }
  });
  const cycle = feedCycle(board.regulators);
  if (cycle) {
    const at = board.regulators.findIndex((regulator) => regulator.ref === cycle[0]);
    report(['regulators', at, 'feed'], `feeds itself in a circle: ${[...cycle, cycle[0]].join(' from ')}`);
  }
  board.conditions.forEach((condition, i) => {
    const known = (field: 'supplies' | 'loadsA' | 'powersW', names: ReadonlySet<string>, what: string) => {
      for (const name of Object.keys(condition[field])) {
        if (!names.has(name)) report(['conditions', i, field, name], `must name a ${what} of this document`);
      }
    };
    known('supplies', supplies, 'supply');
    known('loadsA', regulators, 'regulator');
    known('powersW', sources, 'heat source');
    if (condition.fault?.kind === 'output-short' && !regulators.has(condition.fault.ref)) {
      report(
        ['conditions', i, 'fault', 'ref'],
        `must be a regulator of this document, found ${shown(condition.fault.ref)}`,
      );
    }
  });
}
