/** Text of a mail, made by a pure function of what it tells. */
export type Notice = {
  subject: string;
  text: string;
  /** Holds a link that lets its reader in. */
  holdsToken: boolean;
};

/** Paragraphs with an empty line between them; empty ones left out. */
export function paragraphs(...texts: (string | null)[]): string {
  return `${texts.filter((text) => text !== null && text !== '').join('\n\n')}\n`;
}
