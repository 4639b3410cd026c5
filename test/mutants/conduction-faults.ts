import type { PlantedFault } from './planted-fault.ts';

const guards = 'test/core/thermal/guards';
/** What is read off the assembled board. */
const shapes = ['copper-map', 'face-conductance', 'film-areas'].map((name) => `${guards}/${name}.test.ts`);
/** What is solved on it. */
const conduction = [
  ...['textbook-conduction', 'spreading', 'second-method', 'refinement-of-the-model'].map(
    (name) => `${guards}/${name}.test.ts`,
  ),
  'test/core/thermal/element-functions.test.ts',
  'test/core/thermal/closed-forms.test.ts',
];

/** Faults of geometry, conduction and package. */
export const conductionFaults: readonly PlantedFault[] = [
  {
    fault: 'the sides of a body count once instead of twice',
    file: 'core/thermal/package-star.ts',
    from: 'caseAreaM2: (length * width + 2 * (length + width) * height) * 1e-6',
    to: 'caseAreaM2: (length * width + (length + width) * height) * 1e-6',
    tests: conduction,
  },
  {
    fault: 'the sides of a source’s body forgotten',
    file: 'core/thermal/film-areas.ts',
    from: 'exposed[at]! *= 1 + more;',
    to: 'exposed[at]! *= 1;',
    tests: shapes,
  },
  {
    fault: 'the upper bound of a face alone: conductances averaged across, not in series',
    file: 'core/thermal/face-conductance.ts',
    from: 'return Math.sqrt(lower / upperResistance);',
    to: 'return 1 / upperResistance;',
    tests: shapes,
  },
  {
    fault: 'the arithmetic mean of the two bounds of a face',
    file: 'core/thermal/face-conductance.ts',
    from: 'return Math.sqrt(lower / upperResistance);',
    to: 'return (lower + 1 / upperResistance) / 2;',
    tests: shapes,
  },
  {
    fault: 'length and width of a cell exchanged in its y faces',
    file: 'core/thermal/face-conductance.ts',
    from: 'subColumns, 1) * (dxMm / dyMm);',
    to: 'subColumns, 1) * (dyMm / dxMm);',
    tests: shapes,
  },
  {
    fault: 'copper of two nets that touch joined',
    file: 'core/thermal/face-conductance.ts',
    from: 'const parted = (a: number, b: number) => a !== b && a !== 0 && b !== 0;',
    to: 'const parted = (a: number, b: number) => a !== b && a < 0 && b < 0;',
    tests: shapes,
  },
  {
    fault: 'a plane without clearance to copper of other nets',
    file: 'core/thermal/copper-map.ts',
    from: 'const bars = clearance(board, grid, inside, layer, net);',
    to: 'const bars = clearance({ ...board, viaFields: [], pours: [], regulators: [] }, grid, inside, layer, net);',
    tests: shapes,
  },
  {
    fault: 'a cut-out that conducts',
    file: 'core/thermal/copper-map.ts',
    from: 'inside.fill(0, row * columns + from',
    to: 'inside.fill(1, row * columns + from',
    tests: shapes,
  },
  {
    fault: 'a hole in a pour filled with copper',
    file: 'core/thermal/copper-map.ts',
    from: 'scanFill(grid, [pour.points, ...pour.holes], (row, from, to) => paint(row, from, to, number, value));',
    to: 'scanFill(grid, [pour.points], (row, from, to) => paint(row, from, to, number, value));',
    tests: shapes,
  },
  {
    fault: 'background copper by its coverage alone',
    file: 'core/thermal/materials.ts',
    from: '=> coverage / (2 - coverage);',
    to: '=> coverage;',
    tests: conduction,
  },
  {
    fault: 'copper thickness a thousand times too small',
    file: 'core/thermal/copper-map.ts',
    from: 'copperWPerMK * layer.thicknessUm * 1e-6',
    to: 'copperWPerMK * layer.thicknessUm * 1e-9',
    tests: conduction,
  },
  {
    fault: 'square millimetres taken for a thousandth of a square metre',
    file: 'core/thermal/grid-conductances.ts',
    from: 'const area = dxMm * dyMm * 1e-6;',
    to: 'const area = dxMm * dyMm * 1e-3;',
    tests: conduction,
  },
  {
    fault: 'every slab as good as the first',
    file: 'core/thermal/grid-conductances.ts',
    from: 'layers.through[l]! * area',
    to: 'layers.through[0]! * area',
    tests: conduction,
  },
  {
    fault: 'copper layer off by one in a subdivided stack',
    file: 'core/thermal/board-layers.ts',
    from: 'layers.copper.push(layers.count - 1);',
    to: 'layers.copper.push(layers.count - parts);',
    tests: conduction,
  },
  {
    fault: 'laminate counted twice in plane',
    file: 'core/thermal/board-layers.ts',
    from: 'const sheet = slab.inPlaneWPerMK * thickness;',
    to: 'const sheet = 2 * slab.inPlaneWPerMK * thickness;',
    tests: conduction,
  },
  {
    fault: 'through and in-plane conductivity exchanged',
    file: 'core/thermal/board-layers.ts',
    from: 'layers.through.push(slab.throughWPerMK / thickness);',
    to: 'layers.through.push(slab.inPlaneWPerMK / thickness);',
    tests: conduction,
  },
  {
    fault: 'a via wall plated on one side only',
    file: 'core/thermal/via-conductance.ts',
    from: 'const outer = inner + 2 * via.platingUm * 1e-6;',
    to: 'const outer = inner + via.platingUm * 1e-6;',
    tests: conduction,
  },
  {
    fault: 'via diameters taken for radii',
    file: 'core/thermal/via-conductance.ts',
    from: '(Math.PI / 4) * (copperWPerMK',
    to: 'Math.PI * (copperWPerMK',
    tests: conduction,
  },
  {
    fault: 'every via as long as from the top',
    file: 'core/thermal/via-pairs.ts',
    from: 'const length = layers.depth[b]! - layers.depth[a]!;',
    to: 'const length = layers.depth[b]!;',
    tests: shapes,
  },
  {
    fault: 'a via that joins any copper it meets',
    file: 'core/thermal/via-pairs.ts',
    from: 'net[j * columns + i] === number) return true;',
    to: 'net[j * columns + i] !== 0) return true;',
    tests: shapes,
  },
  {
    fault: 'one land of each package dropped',
    file: 'core/thermal/package-star.ts',
    from: 'const lands = placedLands(board, regulator).map(',
    to: 'const lands = placedLands(board, regulator).slice(0, 1).map(',
    tests: shapes,
  },
  {
    fault: 'the air gap under the body dropped',
    file: 'core/thermal/package-star.ts',
    from: 'if (model.underBodyKPerW !== null) {',
    to: 'if (model.underBodyKPerW !== null && length < 0) {',
    tests: shapes,
  },
  {
    fault: 'solder per pad instead of per area',
    file: 'core/thermal/package-star.ts',
    from: 'g: solderWPerM2K * weights.areaM2 * weights.weight[k]!',
    to: 'g: solderWPerM2K * 1e-9 * weights.weight[k]!',
    tests: conduction,
  },
  {
    fault: 'a part on the bottom not mirrored',
    file: 'core/geometry/placed-rectangle.ts',
    from: "placement.side === 'bottom' ? -x : x",
    to: 'x',
    tests: ['test/core/geometry'],
  },
  {
    fault: 'the correction of a land added twice',
    file: 'core/thermal/package-star.ts',
    from: 'land.kPerW + (corrections',
    to: 'land.kPerW + 2 * (corrections',
    tests: ['test/core/thermal/fine-geometry.test.ts'],
  },
];
