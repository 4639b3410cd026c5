import type { PlantedFault } from './planted-fault.ts';

const guards = 'test/core/thermal/guards';
/** What is known of single formulas, and of boards in air. */
const tests = [
  ...['textbook-films', 'film-areas', 'second-method', 'energy-balance', 'limits'].map(
    (name) => `${guards}/${name}.test.ts`,
  ),
  'test/core/thermal/closed-forms.test.ts',
  'test/core/thermal/invariants.test.ts',
  'test/core/thermal/moving-air.test.ts',
];
/** What is known of the solution as such. */
const solution = [
  'energy-balance',
  'residual',
  'iterative-error',
  'films-loop',
  'superposition',
  'grid-convergence',
].map((name) => `${guards}/${name}.test.ts`);

/** Faults of air, radiation, heat and the solution. */
export const filmFaults: readonly PlantedFault[] = [
  {
    fault: 'a sink at its own temperature with the sign reversed',
    file: 'core/thermal/solve-rises.ts',
    from: 'const over = sink.toC + celsiusOffset - ambientK;',
    to: 'const over = ambientK - sink.toC - celsiusOffset;',
    tests,
  },
  {
    fault: 'the film of the lower face forgotten',
    file: 'core/thermal/solve-rises.ts',
    from: 'anchor[cell * layers + layers - 1]! += films.bottom[cell]!;',
    to: '',
    tests,
  },
  {
    fault: 'the case top dropped, in the matrix and in the balance',
    file: 'core/thermal/case-film.ts',
    from: 'return filmWPerK === 0 ? 0 : 1 / (nodes.caseTopKPerW + 1 / filmWPerK);',
    to: 'return filmWPerK < 0 ? nodes.caseTopKPerW : 0;',
    tests,
  },
  {
    fault: 'the power of the first part dropped',
    file: 'core/thermal/solve-rises.ts',
    from: 'for (const nodes of model.packages) b[nodes.junction]!',
    to: 'for (const nodes of model.packages.slice(1)) b[nodes.junction]!',
    tests: solution,
  },
  {
    fault: 'the ambient in °C taken for kelvins',
    file: 'core/thermal/film-conductances.ts',
    from: 'const ambientK = condition.ambientC + condition.boxRiseK + celsiusOffset;',
    to: 'const ambientK = condition.ambientC + condition.boxRiseK;',
    tests,
  },
  {
    fault: 'the box’s rise dropped',
    file: 'core/thermal/film-conductances.ts',
    from: 'const ambientK = condition.ambientC + condition.boxRiseK + celsiusOffset;',
    to: 'const ambientK = condition.ambientC + celsiusOffset;',
    tests,
  },
  {
    fault: 'radiation as the third power of the air’s temperature',
    file: 'core/thermal/radiation.ts',
    from: '(surfaceK * surfaceK + ambientK * ambientK) * (surfaceK + ambientK)',
    to: '4 * (ambientK * ambientK * ambientK + 0 * surfaceK)',
    tests,
  },
  {
    fault: 'the emissivity of a pour ignored',
    file: 'core/thermal/film-areas.ts',
    from: 'const value = pour.emissivity;',
    to: 'const value = base;',
    tests,
  },
  {
    fault: 'the standard atmosphere with half its exponent',
    file: 'core/thermal/air-properties.ts',
    from: '** 5.2559;',
    to: '** 2.628;',
    tests,
  },
  {
    fault: 'density that does not follow the pressure',
    file: 'core/thermal/air-properties.ts',
    from: 'const density = (pressure * seaLevelPa)',
    to: 'const density = (Math.min(1, pressure + 1) * seaLevelPa)',
    tests,
  },
  {
    fault: 'the lower face cooled as if it looked up',
    file: 'core/thermal/film-conductances.ts',
    from: "attitude: upright ? 'upright' : 'face-down'",
    to: "attitude: upright ? 'upright' : 'face-up'",
    tests,
  },
  {
    fault: 'Churchill and Chu with a wrong exponent',
    file: 'core/thermal/natural-convection.ts',
    from: '** (8 / 27)',
    to: '** (4 / 27)',
    tests,
  },
  {
    fault: 'the length of natural convection ten times too long',
    file: 'core/thermal/film-conductances.ts',
    from: 'return mm * 1e-3;',
    to: 'return mm * 1e-2;',
    tests,
  },
  {
    fault: 'a plate’s laminar film at one temperature instead of one flux',
    file: 'core/thermal/forced-convection.ts',
    from: '0.906 * Math.sqrt(perMetre * x)',
    to: '0.664 * Math.sqrt(perMetre * x)',
    tests,
  },
  {
    fault: 'the turbulent plate with the laminar power',
    file: 'core/thermal/forced-convection.ts',
    from: '(perMetre * x) ** 0.8;',
    to: '(perMetre * x) ** 0.5;',
    tests,
  },
  {
    fault: 'a stopped fan that still blows',
    file: 'core/thermal/film-conductances.ts',
    from: "condition.air.kind === 'moving' && condition.fault?.kind !== 'fan-stopped' ? condition.air : null",
    to: "condition.air.kind === 'moving' ? condition.air : null",
    tests,
  },
  {
    fault: 'air that takes no heat along',
    file: 'core/thermal/air-streaks.ts',
    from: 'shed[cell]! += face.exposed[cell]! * flux;',
    to: 'shed[cell]! += 0;',
    tests,
  },
  {
    fault: 'a film’s temperature that is the wall’s',
    file: 'core/thermal/film-conductances.ts',
    from: 'airProperties(ambientK + driving.rise / 2, pressure)',
    to: 'airProperties(ambientK + 4 * driving.rise, pressure)',
    tests,
  },
  {
    fault: 'the balance of heat not asked for',
    file: 'core/thermal/energy-balance.ts',
    from: 'const difference = Math.abs(into.total - out.total);',
    to: 'const difference = 0 * Math.abs(into.total - out.total);',
    tests: solution,
  },
  {
    fault: 'the linear solution stopped at a hundredth',
    file: 'core/thermal/method.ts',
    from: 'export const linearTolerance = 1e-9;',
    to: 'export const linearTolerance = 1e-4;',
    tests: solution,
  },
  {
    fault: 'films taken as settled far too early',
    file: 'core/thermal/method.ts',
    from: 'export const filmToleranceK = 0.003;',
    to: 'export const filmToleranceK = 1;',
    tests: solution,
  },
  {
    fault: 'the grid error without its safety factor',
    file: 'core/thermal/grid-error.ts',
    from: 'return 3 * near;',
    to: 'return near / 3;',
    tests: solution,
  },
];
