import type { Problem } from '#core/contract/problem.ts';

/** A refused or failed call; `problem` is the server's own document, or one of the two that only the client can state. */
export class ProblemError extends Error {
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.detail);
    this.name = 'ProblemError';
    this.problem = problem;
  }

  get code(): string {
    return this.problem.code;
  }

  get status(): number {
    return this.problem.status;
  }

  /** Message for the field at `path` ("email", "conditions.0.ambientC"), if the server refused it. */
  faultAt(path: string): string | undefined {
    return this.problem.faults?.find((fault) => fault.path === path || fault.path === `body.${path}`)?.message;
  }
}

export const offlineProblem: Problem = {
  type: 'about:blank',
  title: 'No connection',
  status: 0,
  code: 'offline',
  detail: 'The server cannot be reached. Nothing was sent; check the connection and try again.',
};

export function unreadableAnswer(status: number): Problem {
  return {
    type: 'about:blank',
    title: 'Answer not understood',
    status,
    code: 'unreadable-answer',
    detail: `The server answered (${status}), but not in the agreed form. Load the page again; it may be older than the server.`,
  };
}
