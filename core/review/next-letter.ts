/** Letters not used for revisions, as they are mistaken for figures or have another meaning (common practice in drawing control). */
const skipped = 'IOQSXZ';
const letters = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ'.split('').filter((letter) => !skipped.includes(letter));

/** Letter after `letter`: A, B, … Y, AA, AB, …; the first one for null. */
export function nextLetter(letter: string | null): string {
  if (letter === null) return 'A';
  const last = letters.indexOf(letter.slice(-1));
  const next = letters[last + 1];
  if (next) return letter.slice(0, -1) + next;
  return nextLetter(letter.length > 1 ? letter.slice(0, -1) : null) + 'A';
}
