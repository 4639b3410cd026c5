/**
 * Standing text: what the calculation does not cover, and what takes precedence over it. Part of every record; a change of it
 * comes with a change of the method or of what the product can do.
 */
export const notCovered: readonly string[] = [
  'Steady state only: start-up, pulses, thermal cycling, ageing, dust and the wear of parts are not calculated. A shorted output is taken as lasting.',
  'Solder is taken as whole: voids, cold joints and lifted pads make a part hotter than stated here.',
  'Heat that leaves through cables, connectors, cards beside this one, potting, gap pads or a fan’s own stream pattern counts only where it is stated as a sink, a box rise or an air speed. Sunlight does not count at all.',
  'Parts that are not drawn give no heat and take up no air. Copper that is not drawn conducts nothing, except where a layer states background traces.',
  'Package resistances marked as typical belong to the outline and not to the part; the maker’s figures for the very part take precedence.',
  'Supplies, loads and limits are taken as stated. Whether they are the right ones is the judgement of those who sign.',
];

/** What takes precedence over the record, in every place where the method is described. */
export const deference: readonly string[] = [
  'This record states a calculation against the rules chosen for it. It is not a certificate and not a measurement: verify it on the built board before people or property depend on it.',
  'The law, local codes, product safety standards and the judgement of a licensed or otherwise qualified engineer take precedence over this record wherever they differ from it. Where a licence is required to approve such work, this record does not take its place.',
];
