import { electricalFaults } from './electrical-faults.ts';
import { filmFaults } from './film-faults.ts';
import type { PlantedFault } from './planted-fault.ts';
import { conductionFaults } from './conduction-faults.ts';
import { verdictFaults } from './verdict-faults.ts';

/** Every fault that the tests are asked to find. */
export const plantedFaults: readonly PlantedFault[] = [
  ...conductionFaults,
  ...filmFaults,
  ...electricalFaults,
  ...verdictFaults,
];
