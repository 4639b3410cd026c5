import { beforeAll, describe, expect, test } from 'vitest';
import { renderRecord } from '#api/record/render-record.ts';
import { buildRecord } from '#core/record/build-record.ts';
import {
  sampleBoard,
  sampleCondition,
  sampleLimit,
  sampleRecord,
  sampleRegulator,
  sampleResult,
  sampleRevision,
} from '#test/core/record/record-sample.ts';
import { readPdf, type ReadPdf } from './read-pdf.ts';

const verdicts = ['within', 'close', 'over', 'not evaluated'] as const;
const fourVerdicts = () =>
  sampleRecord({
    result: sampleResult(
      [
        sampleCondition(
          'Hot',
          verdicts.map((verdict, k) =>
            sampleRegulator(`U${k + 1}`, {
              verdict,
              limits: [sampleLimit('junctionC', verdict === 'not evaluated' ? null : 97.4, 110, verdict)],
            }),
          ),
        ),
      ],
      { verdict: 'over' },
    ),
    board: {
      ...sampleBoard,
      regulators: verdicts.map((_, k) => ({ ...sampleBoard.regulators[0]!, ref: `U${k + 1}` })),
    },
  });

describe('record as PDF – an issued revision', () => {
  let bytes: Buffer;
  let read: ReadPdf;
  beforeAll(async () => {
    bytes = await renderRecord(buildRecord(fourVerdicts()), 'a4');
    read = await readPdf(bytes);
  });

  test('printed twice – the same bytes', async () => {
    expect((await renderRecord(buildRecord(fourVerdicts()), 'a4')).equals(bytes)).toBe(true);
  });

  test('text – can be selected: verdicts, hashes, people, signatures, caution and assumption', () => {
    const text = read.pages.join(' ');
    for (const verdict of verdicts) expect(text).toContain(verdict);
    expect(text).toContain(`sha256:${'5ca1ab1e'.repeat(8)}`);
    expect(text).toContain('PCA-4711 Sample assembly, revision C');
    expect(text).toContain('Quinn Quality Approval: released 2031-03-05 16:20:07 +00:00');
    expect(text).toContain('CAUTION');
    expect(text).toContain('pours[…].coverage');
    expect(text).not.toMatch(/NaN|undefined|Infinity/);
  });

  test('foot – every page – page x of y, revision, state and the head of the hash', () => {
    read.pages.forEach((page, index) => {
      expect(page).toContain(`page ${index + 1} of ${read.pages.length}`);
      expect(page).toContain('Issued');
      expect(page).toContain('content sha256:5ca1ab1e5ca1ab1e');
    });
  });

  test('issued – no page says that it is not', () => {
    expect(read.pages.join(' ')).not.toContain('NOT ISSUED');
  });

  test('structure – tagged, in English, a bookmark for each section', () => {
    expect(read).toMatchObject({ tagged: true, language: 'en' });
    expect(read.bookmarks).toHaveLength(16);
    expect(read.bookmarks[0]).toBe('1 Verdict');
  });
});

test.each([
  // ISO 216: 210 × 297 mm; ANSI/ASME Y14.1 size A: 8.5 × 11 in; 72 points an inch.
  ['a4', (210 / 25.4) * 72, (297 / 25.4) * 72],
  ['letter', 8.5 * 72, 11 * 72],
] as const)('record on %s – every page – has its size, and no text leaves it', async (paper, width, height) => {
  const { sizes, texts } = await readPdf(await renderRecord(buildRecord(sampleRecord()), paper));
  for (const size of sizes) {
    expect(size[0]).toBeCloseTo(width, 1);
    expect(size[1]).toBeCloseTo(height, 1);
  }
  for (const text of texts) {
    expect(text.x).toBeGreaterThan(40);
    expect(text.x + text.width).toBeLessThan(width - 40);
    expect(text.y).toBeGreaterThan(20);
    expect(text.y).toBeLessThan(height - 20);
  }
});

test.each(['sketch', 'in review', 'sent back', 'cleared', 'withdrawn'] as const)(
  'record of a revision in state %s – every page – carries the mark that it is not issued',
  async (state) => {
    const record = buildRecord(sampleRecord({ revision: sampleRevision(state) }));
    for (const page of (await readPdf(await renderRecord(record, 'a4'))).pages) {
      expect(page).toContain(`NOT ISSUED: ${state.toUpperCase()}`);
    }
  },
);

test('record of a superseded revision – every page – says so', async () => {
  const record = buildRecord(sampleRecord({ revision: sampleRevision('superseded') }));
  for (const page of (await readPdf(await renderRecord(record, 'letter'))).pages) expect(page).toContain('SUPERSEDED');
});

test('record of a document – no date, no revision – is marked and prints alike every time', async () => {
  const record = buildRecord(sampleRecord({ revision: null }));
  const bytes = await renderRecord(record, 'a4');
  expect((await renderRecord(record, 'a4')).equals(bytes)).toBe(true);
  expect(bytes.includes('CreationDate')).toBe(false);
  for (const page of (await readPdf(bytes)).pages) expect(page).toContain('NOT ISSUED: PRINTED FROM A DOCUMENT');
});

test('tables – 20 regulators with long names in three conditions – no row is lost or cut, heads repeat, no text is wider than the page', async () => {
  const refs = Array.from({ length: 20 }, (_, k) => `U${k + 1}_${'regulator'.repeat(3)}`);
  const names = ['Hot', 'Cold', `Surge ${'with_an_unbroken_name_'.repeat(5)}`];
  const conditions = names.map((name) =>
    sampleCondition(
      name,
      refs.map((ref, k) => sampleRegulator(ref, { dissipationW: 0.211 + k / 1000 })),
    ),
  );
  const board = {
    ...sampleBoard,
    regulators: refs.map((ref, k) => ({
      ...sampleBoard.regulators[0]!,
      ref,
      at: [2 + 1.9 * k, 15] as [number, number],
    })),
    conditions: names.map((name) => ({ ...sampleBoard.conditions[0]!, name })),
  };
  const record = buildRecord(sampleRecord({ board, result: sampleResult(conditions) }));
  const { pages, texts } = await readPdf(await renderRecord(record, 'a4'));
  const all = pages.join(' ');
  // Each dissipation stands once in each condition's table of temperatures.
  for (let k = 0; k < 20; k++) expect(all.split((0.211 + k / 1000).toFixed(3)).length - 1).toBe(3);
  const tablesOfLimits = pages.filter((page) => page.includes('R2 Input voltage 20.00'));
  expect(tablesOfLimits.length).toBeGreaterThan(3);
  for (const page of tablesOfLimits) expect(page).toContain('Derated limit');
  const figures = pages.flatMap((page, k) => (/Layer L1|layer L1/.test(page) ? [k + 1] : []));
  const lines = texts
    .filter(({ page }) => !figures.includes(page))
    .toSorted((a, b) => a.page - b.page || a.y - b.y || a.x - b.x);
  lines.forEach((text, k) => {
    const next = lines[k + 1];
    const isNeighbour = next && next.page === text.page && next.y === text.y;
    expect(text.x + text.width).toBeLessThan(isNeighbour ? next.x + 0.01 : 595.28 - 40);
  });
  // Nothing of a table stands in the foot, which begins 47 points above the lower edge.
  const foot = texts.filter(({ y }) => y < 47).map(({ text }) => text);
  expect(foot.every((text) => /^(Derating record|content|page)/.test(text))).toBe(true);
});

test('comment – higher than a page – begins below its heading and goes on over the pages, every line of it', async () => {
  const text = Array.from({ length: 150 }, (_, k) => `line-${k + 1}-of-the-comment`).join('\n');
  const comments = [{ author: 'Rolf', text, createdAt: '2031-03-03T10:00:00Z', resolvedBy: null }];
  const record = buildRecord(sampleRecord({ revision: sampleRevision('in review', { comments }) }));
  const { pages } = await readPdf(await renderRecord(record, 'a4'));
  const all = pages.join(' ');
  const started = pages.find((page) => page.includes('Comments of the review'));
  expect(started).toContain('line-1-of-the-comment');
  for (let k = 1; k <= 150; k++) expect(all).toContain(`line-${k}-of-the-comment`);
});

test('name – with a letter that the font lacks – keeps its code point', async () => {
  const record = buildRecord(
    sampleRecord({ revision: sampleRevision('cleared', { authors: ['Jan \u6F22', 'Zoë Łukasz'] }) }),
  );
  const { pages } = await readPdf(await renderRecord(record, 'a4'));
  expect(pages[0]).toContain('Jan [U+6F22], Zoë Łukasz');
});
