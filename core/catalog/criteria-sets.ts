import type { Criteria } from '#core/board/criteria.ts';

/**
 * Derating rule sets as data. Only values that were read in the document or are quoted by another public text, each with
 * its mark; house habits are marked as common practice. The documents disagree: none is "the" derating.
 */
export const criteriaSets: readonly Criteria[] = [
  {
    name: 'MIL-STD-975H',
    rules: [
      {
        quantity: 'junctionC',
        atMostC: 100,
        document: 'MIL-STD-975H (NASA)',
        clause: 'App. A 3.7, linear microcircuits',
        mark: 'second-hand',
      },
    ],
  },
  {
    name: 'JPL worst case',
    rules: [
      {
        quantity: 'junctionC',
        atMostC: 110,
        document: 'NASA LLIS-0703, Part Junction Temperature',
        clause: 'design temperature 75 °C and a junction rise of 35 K at most',
        mark: 'read',
      },
    ],
  },
  ...(
    [
      ['I', 80, 0.6, 0.7],
      ['II', 95, 0.7, 0.8],
      ['III', 105, 0.7, 0.8],
    ] as const
  ).map(([level, atMostC, inputRatio, outputRatio]): Criteria => ({
    name: `GJB/Z 35 level ${level}`,
    rules: [
      {
        quantity: 'junctionC',
        atMostC,
        document: 'GJB/Z 35',
        clause: 'analogue integrated circuits',
        level,
        mark: 'second-hand',
      },
      {
        quantity: 'inputV',
        ratio: inputRatio,
        document: 'GJB/Z 35',
        clause: 'amplifier row',
        level,
        mark: 'second-hand',
      },
      {
        quantity: 'outputA',
        ratio: outputRatio,
        document: 'GJB/Z 35',
        clause: 'amplifier row',
        level,
        mark: 'second-hand',
      },
    ],
  })),
  {
    name: 'Railway on-board equipment',
    rules: [
      {
        quantity: 'junctionC',
        atMostC: 110,
        document: 'RFI TC.PATC SR CM 03 M 69',
        revision: 'F',
        clause: 'vol. 3 App. B, digital integrated circuits',
        mark: 'read',
      },
    ],
  },
  {
    name: '25 K below maximum',
    rules: [
      { quantity: 'junctionC', belowMaxK: 25, source: 'Habit of the trade, no single source', mark: 'common-practice' },
    ],
  },
  {
    name: '80 % of the maximum in °C',
    rules: [
      {
        quantity: 'junctionC',
        ratio: 0.8,
        source: 'Habit of the trade; a percentage of a Celsius reading has no physical meaning',
        mark: 'common-practice',
      },
    ],
  },
];
