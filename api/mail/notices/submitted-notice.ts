import { type Notice, paragraphs } from '../notice.ts';
import { resultLines, type RevisionFacts } from './revision-facts.ts';

export function submittedNotice(facts: RevisionFacts & { reason: string }): Notice {
  return {
    subject: `${facts.revision} waits for your review`,
    text: paragraphs(
      `Hello ${facts.recipient},`,
      `${facts.actor} submitted ${facts.revision} (${facts.title}) for review.`,
      resultLines(facts.result),
      facts.reason === '' ? null : `Note: ${facts.reason}`,
      `${facts.page}/review`,
    ),
    holdsToken: false,
  };
}
