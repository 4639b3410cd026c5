import { expect, test } from 'vitest';
import { nextLetter } from '#core/review/next-letter.ts';

test('revision letters – one after the other – skip I, O, Q, S, X and Z', () => {
  const letters: string[] = [];
  let letter: string | null = null;
  for (let index = 0; index < 22; index++) {
    letter = nextLetter(letter);
    letters.push(letter);
  }
  // The twenty letters that are left, then two of them.
  expect(letters.join(' ')).toBe('A B C D E F G H J K L M N P R T U V W Y AA AB');
});

test.each([
  ['AY', 'BA'],
  ['YY', 'AAA'],
])('revision letters – after %s – carry to %s', (from, to) => {
  expect(nextLetter(from)).toBe(to);
});
