import { textPieces } from './text-pieces.ts';

/** Plain text of a message; addresses in it can be followed, anything else stays text. */
export function MailText({ text }: { text: string }) {
  return (
    <div className="max-w-prose break-words whitespace-pre-wrap">
      {textPieces(text).map((piece, index) =>
        piece.link ? (
          <a key={index} href={piece.text} className="break-all text-copper underline underline-offset-4">
            {piece.text}
          </a>
        ) : (
          piece.text
        ),
      )}
    </div>
  );
}
