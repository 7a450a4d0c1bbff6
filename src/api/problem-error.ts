import type { FieldProblem, ProblemBody } from '../../shared/problem.ts';

/** What every failed request throws: field, page or boundary decides how to show it. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';
  readonly status: number;
  readonly problem: ProblemBody;

  constructor(problem: ProblemBody) {
    super(problem.detail ?? problem.title);
    this.status = problem.status;
    this.problem = problem;
  }

  get fields(): FieldProblem[] {
    return this.problem.errors ?? [];
  }
}
