import { HttpProblem } from "@/lib/http";

/** A revision as an entity tag (RFC 9110). */
export function entityTag(revision: number): string {
  return `"${revision}"`;
}

/** The revision that `If-Match` names. Throws 428 without one, 422 for one that is no revision. */
export function requireRevision(request: Request): number {
  const header = request.headers.get("if-match");
  if (header === null)
    throw new HttpProblem("precondition-required", {
      detail: "Send If-Match with the ETag of the draft you changed.",
    });
  const [, revision] = /^(?:W\/)?"(\d{1,15})"$/.exec(header.trim()) ?? [];
  if (revision === undefined)
    throw new HttpProblem("validation", {
      errors: [{ path: "If-Match", message: "This is not the ETag of a draft." }],
    });
  return Number(revision);
}
