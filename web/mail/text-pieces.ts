export type TextPiece = { text: string; link: boolean };

/** Cuts a text at its http addresses; a full stop or bracket at the end of one belongs to the sentence. */
export function textPieces(text: string): TextPiece[] {
  return text
    .split(/(https?:\/\/[^\s<>"]*[^\s<>".,;:!?)\]])/)
    .map((piece, index) => ({ text: piece, link: index % 2 === 1 }))
    .filter((piece) => piece.text !== '');
}
