import { expect, test } from 'vitest';
import { textPieces } from '#web/mail/text-pieces.ts';

test('mail text – an address at the end of a sentence – a link without the full stop', () => {
  expect(textPieces('Join: http://127.0.0.1:4680/invitations/a-B_1. Bye')).toEqual([
    { text: 'Join: ', link: false },
    { text: 'http://127.0.0.1:4680/invitations/a-B_1', link: true },
    { text: '. Bye', link: false },
  ]);
});

test('mail text – any other scheme – stays text', () => {
  expect(textPieces('javascript:alert(1)').every((piece) => !piece.link)).toBe(true);
});
