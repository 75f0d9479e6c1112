/** The problem types of the API (RFC 9457), one row each: stable slug, status and title. */
export const problems = {
  validation: { status: 422, title: "What was sent does not have the right shape" },
  "bad-json": { status: 400, title: "The body is not JSON" },
  "unsupported-media-type": { status: 415, title: "The body must be application/json" },
  "too-large": { status: 413, title: "The body is too large" },
  "signed-out": { status: 401, title: "You are signed out" },
  "wrong-credentials": { status: 401, title: "The address or the password is wrong" },
  forbidden: { status: 403, title: "You may not do this" },
  "cross-site": { status: 403, title: "This request came from another site" },
  "not-found": { status: 404, title: "There is nothing here" },
  conflict: { status: 409, title: "This cannot be done as things stand" },
  "same-content": { status: 409, title: "A version with this content exists" },
  "has-errors": { status: 409, title: "Some cells have errors" },
  "precondition-failed": { status: 412, title: "Somebody saved first" },
  "precondition-required": { status: 428, title: "Say which revision you changed" },
  "too-many-requests": { status: 429, title: "Too many requests" },
  limit: { status: 422, title: "A limit of the product is exceeded" },
  "token-invalid": { status: 400, title: "This link is no longer valid" },
  busy: { status: 503, title: "Too many evaluations are waiting" },
  "storage-full": { status: 507, title: "There is no room left to save this" },
  "storage-busy": { status: 503, title: "The database is busy" },
  internal: { status: 500, title: "Something went wrong on our side" },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemType = keyof typeof problems;

/** Fields that a problem may carry beside its type. */
export interface ProblemDetails {
  readonly detail?: string;
  readonly errors?: readonly { path: string; message: string }[];
  readonly headers?: Readonly<Record<string, string>>;
  /** Further members of the problem object, such as `current` with 412. */
  readonly more?: Readonly<Record<string, unknown>>;
}

/** Thrown anywhere below a route; the wrapper answers it. */
export class HttpProblem extends Error {
  constructor(
    readonly type: ProblemType,
    readonly details: ProblemDetails = {},
  ) {
    super(details.detail ?? problems[type].title);
  }
}

/** The answer that tells a problem. */
export function problemResponse(type: ProblemType, details: ProblemDetails = {}): Response {
  const { status, title } = problems[type];
  const body = {
    type: `/problems/${type}`,
    title,
    status,
    ...(details.detail === undefined ? {} : { detail: details.detail }),
    ...(details.errors === undefined ? {} : { errors: details.errors }),
    ...details.more,
  };
  return new Response(JSON.stringify(body), {
    status,
    headers: {
      "content-type": "application/problem+json; charset=utf-8",
      "cache-control": "no-store",
      ...details.headers,
    },
  });
}
