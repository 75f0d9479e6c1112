import { randomUUID } from "node:crypto";
import type { z } from "zod";
import { type StorageFault, storageFault } from "@/db";
import { personFromRequest, type SignedIn } from "@/lib/auth";
import { limits } from "@/lib/schema";
import { refuseCrossSite } from "./cross-site";
import { once } from "./idempotency";
import { HttpProblem, problemResponse } from "./problems";
import { readBody } from "./read-body";

/** Room for a calculation of the largest size inside its envelope. */
const usualBodyBytes = limits.fileBytes + 100_000;

/** What a handler works with: everything parsed, the permission settled. */
export interface RouteContext<Person, Params, Query, Body> {
  readonly request: Request;
  readonly person: Person;
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
}

type Permission = "anyone" | "signed-in";
type PersonOf<P extends Permission> = P extends "signed-in" ? SignedIn : SignedIn | null;
type Of<S> = S extends z.ZodType ? z.output<S> : undefined;

export interface RouteOptions<P extends Permission, Params, Query, Body> {
  /** Who may call; what a caller may do to one object is asked of `can()` inside. */
  readonly permission: P;
  readonly params?: Params;
  readonly query?: Query;
  readonly body?: Body;
  readonly bodyBytes?: number;
}

type NextContext = { params: Promise<Record<string, string | string[] | undefined>> };

function parse<S extends z.ZodType>(schema: S | undefined, value: unknown, where: string): Of<S> {
  if (!schema) return undefined as Of<S>;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data as Of<S>;
  const overLimit = parsed.error.issues.find(
    (issue) => issue.code === "custom" && issue.params?.limit !== undefined,
  );
  const errors = parsed.error.issues.slice(0, 20).map((issue) => ({
    path: [where, ...issue.path].filter((part) => part !== "").join("."),
    message: issue.message,
  }));
  if (overLimit) throw new HttpProblem("limit", { detail: overLimit.message, errors });
  throw new HttpProblem("validation", { errors });
}

async function context<P extends Permission, Params, Query, Body>(
  options: RouteOptions<P, Params, Query, Body>,
  request: Request,
  next: NextContext,
) {
  refuseCrossSite(request);
  const person = await personFromRequest(request);
  if (options.permission === "signed-in" && !person) throw new HttpProblem("signed-out");
  const query = Object.fromEntries(new URL(request.url).searchParams);
  const sent = options.body
    ? await readBody(request, options.bodyBytes ?? usualBodyBytes)
    : undefined;
  return {
    request,
    person: person as PersonOf<P>,
    params: parse(options.params as z.ZodType | undefined, await next.params, "") as Of<Params>,
    query: parse(options.query as z.ZodType | undefined, query, "") as Of<Query>,
    body: parse(options.body as z.ZodType | undefined, sent, "") as Of<Body>,
    sent,
  };
}

/** The disk or another process is in the way: nothing was saved, and trying again may help. */
function answerStorageFault(fault: StorageFault, error: unknown): Response {
  console.error(fault, error);
  return problemResponse(fault, {
    detail: "Nothing was saved. What you typed is still in this browser; try again later.",
    headers: { "retry-after": fault === "storage-full" ? "60" : "2" },
  });
}

function answerError(error: unknown, request: Request): Response {
  if (error instanceof HttpProblem) return problemResponse(error.type, error.details);
  if (error instanceof Error && error.name === "EvaluatorBusyError") {
    return problemResponse("busy", { headers: { "retry-after": "2" } });
  }
  const fault = storageFault(error);
  if (fault) return answerStorageFault(fault, error);
  const incident = randomUUID();
  console.error(`incident ${incident}: ${request.method} ${new URL(request.url).pathname}`, error);
  return problemResponse("internal", {
    detail: `Nothing you typed is lost. If it happens again, report the incident ${incident}.`,
  });
}

/**
 * The one way to make a route handler: the permission, the schemas of everything that comes in, and
 * what to do. Answers every problem as RFC 9457; refuses writes from other sites; does a write that
 * repeats under one `Idempotency-Key` once.
 */
export function route<
  P extends Permission,
  Params extends z.ZodType | undefined = undefined,
  Query extends z.ZodType | undefined = undefined,
  Body extends z.ZodType | undefined = undefined,
>(
  options: RouteOptions<P, Params, Query, Body>,
  handler: (
    context: RouteContext<PersonOf<P>, Of<Params>, Of<Query>, Of<Body>>,
  ) => Promise<Response> | Response,
) {
  return async (request: Request, next: NextContext): Promise<Response> => {
    try {
      const { sent, ...ready } = await context(options, request, next);
      const work = async () => handler(ready);
      const { person } = ready;
      if (request.method !== "POST" || !person) return await work();
      return await once({ request, userId: person.id, body: sent }, work);
    } catch (error) {
      return answerError(error, request);
    }
  };
}

/** A JSON answer, not stored by caches unless said otherwise. */
export function json(
  value: unknown,
  init: { status?: number; headers?: Record<string, string> } = {},
): Response {
  return new Response(JSON.stringify(value), {
    status: init.status ?? 200,
    headers: {
      "content-type": "application/json; charset=utf-8",
      "cache-control": "no-store",
      ...init.headers,
    },
  });
}
