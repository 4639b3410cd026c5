/** Laminate conductivities, W/(m·K), each with its source. */
export type Laminate = { name: string; layer: { inPlaneWPerMK: number; throughWPerMK: number }; source: string };

export const laminates: readonly Laminate[] = [
  {
    name: 'FR-4, usual',
    layer: { inPlaneWPerMK: 0.9, throughWPerMK: 0.3 },
    source: 'Middle of the measured ranges 0.8–1.06 in plane and 0.29–0.34 through',
  },
  {
    name: 'FR-4, as measured',
    layer: { inPlaneWPerMK: 1.059, throughWPerMK: 0.343 },
    source: 'Sarvar, Poole, Witting, J. Electron. Mater. 19 (1990) 1345',
  },
  {
    name: 'Metal-core dielectric',
    layer: { inPlaneWPerMK: 2, throughWPerMK: 2 },
    source: 'Common practice: filled epoxy of 1 to 3 W/(m·K); use the maker’s value',
  },
];
