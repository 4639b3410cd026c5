/** The parts of the method in plain words, each with its source and the range it holds in; outside it a result carries a finding. */
export const parts: readonly { name: string; text: string; source: string; range: string | null }[] = [
  {
    name: 'Dissipation',
    text: 'Input voltage less output voltage, times the load, plus input voltage times the ground-pin current, at the highest input and the lowest output.',
    source: 'Data-sheet tables of the part.',
    range: null,
  },
  {
    name: 'Copper and laminate',
    text: 'Each layer is a sheet of cells. Between two cells the conductance comes from the true outline of the copper, in its own direction, as the geometric mean of the two classical bounds. Copper of two nets never joins, except through laminate.',
    source:
      'Copper 390 W/(m·K), between Cengel (ex. 3-5) and Incropera (ex. 3.9). Laminate as stated; measured by Sarvar, Poole and Witting (1990).',
    range: 'shapes finer than about 0.14 mm are rounded to it',
  },
  {
    name: 'Vias',
    text: 'Each barrel is a conductance between the copper layers of its own net: finished hole, plating and filling.',
    source: 'Cylinder wall, k·A ÷ length.',
    range: 'usual drills and platings',
  },
  {
    name: 'Package',
    text: 'A star from the junction to every land, to the case top and to the board under the body. ψ values are never branches.',
    source: 'JESD15-3 is its case of one land; values from the data sheet, or typical of the outline and marked so.',
    range: null,
  },
  {
    name: 'Still air',
    text: 'Natural convection by the attitude of each face, driven by the mean rise of the warm part.',
    source:
      'Churchill and Chu (upright); Raithby and Hollands (lying, from memory; held against other published fits).',
    range: 'Rayleigh number 1 to 1e10, air 200 to 600 K',
  },
  {
    name: 'Moving air',
    text: 'Laminar plate from the leading edge, raised for the parts that trip the flow, blended with natural convection; air that was warmed upstream warms what follows.',
    source: 'Plate formulas as in Cengel, Incropera and Holman.',
    range: '0.3 to 3 m/s, Reynolds number to 5e5',
  },
  {
    name: 'Radiation, altitude',
    text: 'Grey radiation of every face to surroundings at air temperature; thinner air by the standard atmosphere.',
    source: 'ε·σ·(Ts² + Ta²)·(Ts + Ta); ISA.',
    range: 'to 11 000 m, rises to 250 K',
  },
  {
    name: 'Solution',
    text: 'Conjugate gradients to a residual of 1e-9, films followed until nothing moves by 0.01 K. A result whose heat balance is off by more than one part in a million is refused.',
    source: 'Templates for the Solution of Linear Systems (1994).',
    range: null,
  },
  {
    name: 'Grid error',
    text: 'The same board on cells of twice the size; three times the difference is stated.',
    source: 'Roache, J. Fluids Eng. 116 (1994) 405.',
    range: null,
  },
];
