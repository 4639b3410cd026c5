import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';
import { shown } from '../quantity.ts';

/** Names that must be used once: layers, pours, via fields, sinks, probes, supplies, conditions, and references of parts. */
export function checkNames(board: Board, report: Report) {
  const once = (path: string[], field: string, names: readonly string[]) => {
    const seen = new Set<string>();
    names.forEach((name, index) => {
      if (seen.has(name)) report([...path, index, field], `${shown(name)} is used twice`);
      seen.add(name);
    });
  };
  once(
    ['stackup', 'copper'],
    'name',
    board.stackup.copper.map((layer) => layer.name),
  );
  once(
    ['pours'],
    'id',
    board.pours.map((pour) => pour.id),
  );
  once(
    ['viaFields'],
    'id',
    board.viaFields.map((via) => via.id),
  );
  once(
    ['sinks'],
    'id',
    board.sinks.map((sink) => sink.id),
  );
  once(
    ['probes'],
    'id',
    board.probes.map((probe) => probe.id),
  );
  once(
    ['supplies'],
    'name',
    board.supplies.map((supply) => supply.name),
  );
  once(
    ['conditions'],
    'name',
    board.conditions.map((condition) => condition.name),
  );
  once(
    ['regulators'],
    'ref',
    board.regulators.map((regulator) => regulator.ref),
  );
  const refs = new Set(board.regulators.map((regulator) => regulator.ref));
  once(
    ['sources'],
    'ref',
    board.sources.map((source) => source.ref),
  );
  board.sources.forEach((source, index) => {
    if (refs.has(source.ref)) report(['sources', index, 'ref'], `${shown(source.ref)} is already a regulator`);
  });
}
