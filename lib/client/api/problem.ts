import type { Fault, ProblemCode, ProblemDetails } from '@/lib/api';

/** `offline`: no answer came at all, so whether the request arrived isn't known. */
export type ClientProblemCode = ProblemCode | 'offline';

/** A refused request. `message` is written for people: what happened, what is kept, what next. */
export class Problem extends Error {
  constructor(
    readonly code: ClientProblemCode,
    /** 0 where no answer came. */
    readonly status: number,
    detail: string,
    readonly details: ProblemDetails | null = null,
  ) {
    super(detail);
    this.name = 'Problem';
  }

  get faults(): readonly Fault[] {
    return this.details?.faults ?? [];
  }

  /** What the server holds now, where the request was made from something older. */
  get current(): unknown {
    return this.details?.current;
  }

  get reference(): string | null {
    return this.details?.reference ?? null;
  }
}

export const offline = (): Problem =>
  new Problem('offline', 0, 'The server can’t be reached. Nothing on this screen is lost.');

/** Reads a refusal. A proxy or a crash may answer with something that isn't problem details. */
export async function problemFrom(response: Response): Promise<Problem> {
  const details = await response.json().catch(() => null);
  if (isProblemDetails(details)) {
    return new Problem(details.code, response.status, details.detail, details);
  }
  return new Problem(
    'unknown',
    response.status,
    `The server answered ${response.status} without saying why. Nothing on this screen is lost; try again.`,
  );
}

function isProblemDetails(value: unknown): value is ProblemDetails {
  return (
    typeof value === 'object' &&
    value !== null &&
    'code' in value &&
    typeof value.code === 'string' &&
    'detail' in value &&
    typeof value.detail === 'string'
  );
}
