import { type Notice, paragraphs } from '../notice.ts';
import { resultLines, type RevisionFacts } from './revision-facts.ts';

export function issuedNotice(facts: RevisionFacts): Notice {
  return {
    subject: `${facts.revision} is issued`,
    text: paragraphs(
      `Hello ${facts.recipient},`,
      `${facts.actor} issued ${facts.revision} (${facts.title}). It is frozen; the record can be printed.`,
      resultLines(facts.result),
      `${facts.page}/record`,
    ),
    holdsToken: false,
  };
}
