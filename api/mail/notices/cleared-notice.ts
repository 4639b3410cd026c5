import { type Notice, paragraphs } from '../notice.ts';
import { resultLines, type RevisionFacts } from './revision-facts.ts';

export function clearedNotice(facts: RevisionFacts): Notice {
  return {
    subject: `${facts.revision} is cleared`,
    text: paragraphs(
      `Hello ${facts.recipient},`,
      `${facts.actor} cleared ${facts.revision} (${facts.title}) after review. A quality engineer may issue it.`,
      resultLines(facts.result),
      `${facts.page}/review`,
    ),
    holdsToken: false,
  };
}
