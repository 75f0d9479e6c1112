import { settings } from "@/lib/settings";
import { HttpProblem } from "./problems";

const safeMethods = new Set(["GET", "HEAD", "OPTIONS"]);

function sameOrigin(origin: string, request: Request): boolean {
  try {
    const from = new URL(origin);
    const ours = new URL(settings().appUrl).origin;
    return from.origin === ours || from.host === request.headers.get("host");
  } catch {
    return false;
  }
}

/**
 * Refuse a write that another site made with this browser's cookies. Browsers send `Origin` or
 * `Sec-Fetch-Site` with every write; a script that sends neither must not send a cookie either.
 */
export function refuseCrossSite(request: Request): void {
  if (safeMethods.has(request.method)) return;
  const site = request.headers.get("sec-fetch-site");
  const origin = request.headers.get("origin");
  if (site !== null && site !== "same-origin" && site !== "none")
    throw new HttpProblem("cross-site");
  if (origin !== null && !sameOrigin(origin, request)) throw new HttpProblem("cross-site");
  if (site === null && origin === null && request.headers.has("cookie")) {
    throw new HttpProblem("cross-site", {
      detail: "A script sends an Origin header, or no cookie.",
    });
  }
}
