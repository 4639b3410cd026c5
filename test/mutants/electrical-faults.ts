import type { PlantedFault } from './planted-fault.ts';

const tests = ['test/core/electrical'];

/** Faults from volts and amperes to watts. */
export const electricalFaults: readonly PlantedFault[] = [
  {
    fault: 'the heat of the ground current dropped',
    file: 'core/electrical/operating-points.ts',
    from: '(inputV - outputV) * outputA + inputV * groundA;',
    to: '(inputV - outputV) * outputA;',
    tests,
  },
  {
    fault: 'dropout added to the headroom',
    file: 'core/electrical/operating-points.ts',
    from: 'lowInputV - highestV - dropoutV,',
    to: 'lowInputV - highestV + dropoutV,',
    tests,
  },
  {
    fault: 'headroom against the lowest output',
    file: 'core/electrical/operating-points.ts',
    from: 'lowInputV - highestV - dropoutV,',
    to: 'lowInputV - lowestV - dropoutV,',
    tests,
  },
  {
    fault: 'heat with the highest output instead of the lowest',
    file: 'core/electrical/operating-points.ts',
    from: 'const lowestV = part.outputV * (1 - part.outputTolerancePct / 100);',
    to: 'const lowestV = part.outputV * (1 + part.outputTolerancePct / 100);',
    tests,
  },
  {
    fault: 'an output held in dropout',
    file: 'core/electrical/operating-points.ts',
    from: 'held ? lowestV : Math.max(0, inputV - dropoutV)',
    to: 'held ? lowestV : lowestV',
    tests,
  },
  {
    fault: 'the heat corner at the supply’s minimum',
    file: 'core/electrical/operating-points.ts',
    from: 'heatV: stated ?? supply.maxV,',
    to: 'heatV: stated ?? supply.minV,',
    tests,
  },
  {
    fault: 'a dropper that does not carry the ground current',
    file: 'core/electrical/operating-points.ts',
    from: 'feedV - drop - resistance * inputA);',
    to: 'feedV - drop - resistance * outputA);',
    tests,
  },
  {
    fault: 'the ground currents of fed regulators not carried up',
    file: 'core/electrical/output-currents.ts',
    from: 'sum + current!.outputA + current!.groundA, 0)',
    to: 'sum + current!.outputA, 0)',
    tests,
  },
  {
    fault: 'a folded-back short at the knee’s current',
    file: 'core/electrical/output-currents.ts',
    from: "limit.kind === 'constant' ? limit.limitA : limit.shortA;",
    to: "limit.kind === 'constant' ? limit.limitA : limit.kneeA;",
    tests,
  },
  {
    fault: 'tables read in steps instead of straight lines',
    file: 'core/electrical/current-table.ts',
    from: 'return v0 + ((v1 - v0) * (currentA - i0)) / (i1 - i0);',
    to: 'return v0 + 0 * ((v1 - v0) * (currentA - i0)) / (i1 - i0);',
    tests,
  },
  {
    fault: 'the dropper’s heat with the pin’s voltage',
    file: 'core/electrical/operating-points.ts',
    from: 'dropperW: Math.max(0, feedV - inputV) * inputA,',
    to: 'dropperW: Math.max(0, inputV) * inputA,',
    tests,
  },
];
