/** How a service refuses a request. The status of each code is in the one table, openapi/schemas/problem.ts. */
import { type Bound, PROBLEMS, type ProblemCode, type ProblemFault } from '@/openapi/schemas/problem';

/** A fault of the input, before it is known whether the input came in body, query or path. */
export type InputFault = Omit<ProblemFault, 'in'> & Partial<Pick<ProblemFault, 'in'>>;

/** What a refusal can carry beside its sentence. */
export interface AppErrorParts {
  readonly faults?: readonly InputFault[];
  readonly bound?: Bound;
  readonly headers?: Readonly<Record<string, string>>;
}

/** A request that we refuse, in words that the caller may read. */
export class AppError extends Error {
  readonly code: ProblemCode;
  readonly faults: readonly InputFault[];
  readonly bound: Bound | undefined;
  readonly headers: Readonly<Record<string, string>>;

  constructor(code: ProblemCode, detail: string, { faults = [], bound, headers = {} }: AppErrorParts = {}) {
    super(detail);
    this.name = 'AppError';
    this.code = code;
    this.faults = faults;
    this.bound = bound;
    this.headers = headers;
  }

  /** The HTTP status that the table gives this code. */
  get status(): number {
    return PROBLEMS[this.code].status;
  }
}
