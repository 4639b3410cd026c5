import { type Notice, paragraphs } from '../notice.ts';
import { resultLines, type RevisionFacts } from './revision-facts.ts';

export function sentBackNotice(facts: RevisionFacts & { reason: string }): Notice {
  return {
    subject: `${facts.revision} was sent back`,
    text: paragraphs(
      `Hello ${facts.recipient},`,
      `${facts.actor} sent ${facts.revision} (${facts.title}) back.`,
      resultLines(facts.result),
      `Reason: ${facts.reason}`,
      `${facts.page}/review`,
    ),
    holdsToken: false,
  };
}
