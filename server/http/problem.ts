import { PROBLEMS, type FieldProblem, type ProblemBody, type ProblemName } from '../../shared/problem.ts';

interface ProblemOptions {
  detail?: string;
  errors?: FieldProblem[];
  /** Members of this occasion's own (RFC 9457, 3.2), described with the route that answers them. */
  extension?: Record<string, unknown>;
  cause?: unknown;
}

/** What code throws to answer anything but success: a name from the closed list, and a sentence for the reader. */
export class Problem extends Error {
  override readonly name = 'Problem';
  readonly problem: ProblemName;
  readonly detail: string | undefined;
  readonly errors: FieldProblem[] | undefined;
  readonly extension: Record<string, unknown> | undefined;

  constructor(problem: ProblemName, options: ProblemOptions = {}) {
    super(options.detail ?? PROBLEMS[problem].title, { cause: options.cause });
    this.problem = problem;
    this.detail = options.detail;
    this.errors = options.errors;
    this.extension = options.extension;
  }

  get status(): number {
    return PROBLEMS[this.problem].status;
  }

  toBody(requestId: string | undefined): ProblemBody {
    return {
      ...this.extension,
      type: `/problems/${this.problem}`,
      title: PROBLEMS[this.problem].title,
      status: this.status,
      ...(this.detail === undefined ? {} : { detail: this.detail }),
      ...(this.errors === undefined ? {} : { errors: this.errors }),
      ...(requestId === undefined ? {} : { requestId }),
    };
  }
}

/** 422 with every field at fault. */
export function invalid(errors: FieldProblem[], detail?: string): Problem {
  return new Problem('invalid', { errors, ...(detail === undefined ? {} : { detail }) });
}

/** 404, said of what is another's in the same words as of what never was. */
export function notFound(thing: string): Problem {
  return new Problem('notFound', { detail: `There is no such ${thing} among yours.` });
}

/** The thing, or 404 in its name where there is none. */
export function found<T>(value: T | null | undefined, thing: string): T {
  if (value === null || value === undefined) throw notFound(thing);
  return value;
}

/** Throws 422 where any field is at fault. */
export function refuseIfAny(errors: FieldProblem[]): void {
  if (errors.length > 0) throw invalid(errors);
}
