import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';
import { shown } from '../quantity.ts';

/** One dielectric between every two copper layers; every layer that is named exists; vias run downwards. */
export function checkStackup(board: Board, report: Report) {
  const { copper, dielectric } = board.stackup;
  if (dielectric.length !== copper.length - 1) {
    report(
      ['stackup', 'dielectric'],
      `must have ${copper.length - 1} in its list, one between every two of the ${copper.length} copper layers, found ${dielectric.length}`,
    );
  }
  const order = copper.map((layer) => layer.name);
  const known = (path: readonly PropertyKey[], name: string) => {
    if (!order.includes(name)) report(path, `must be a copper layer (${order.join(', ')}), found ${shown(name)}`);
  };
  board.pours.forEach((pour, i) => known(['pours', i, 'layer'], pour.layer));
  board.sinks.forEach((sink, i) => known(['sinks', i, 'layer'], sink.layer));
  board.viaFields.forEach((via, i) => {
    known(['viaFields', i, 'from'], via.from);
    known(['viaFields', i, 'to'], via.to);
    const [from, to] = [order.indexOf(via.from), order.indexOf(via.to)];
    if (from >= 0 && to >= 0 && from >= to) {
      report(['viaFields', i, 'to'], `must lie below ${via.from} in the stack-up, found ${shown(via.to)}`);
    }
  });
}
