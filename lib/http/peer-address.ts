import { subscribe } from "node:diagnostics_channel";
import type { IncomingMessage } from "node:http";
import { settings } from "@/lib/settings";

const forwardedFor = "x-forwarded-for";
/** Longer than any address; what is longer is somebody's invention. */
const mostCharacters = 64;

/** Append where a connection comes from to its `X-Forwarded-For`, as each proxy before us did. */
export function notePeerAddress(request: Pick<IncomingMessage, "headers" | "socket">): void {
  const peer = request.socket.remoteAddress ?? "unknown";
  const before = request.headers[forwardedFor];
  request.headers[forwardedFor] = before === undefined ? peer : `${before}, ${peer}`;
}

/** Do so for every request that this process is sent from now on. */
export function notePeerAddresses(): void {
  subscribe("http.server.request.start", (message) => {
    notePeerAddress((message as { request: IncomingMessage }).request);
  });
}

/**
 * The address a request came from: in `X-Forwarded-For`, the one that the outermost of our own proxies
 * saw. What stands before it was written by the sender and is not believed.
 */
export function addressOf(request: Request): string {
  const seen = (request.headers.get(forwardedFor) ?? "").split(",").map((part) => part.trim());
  const address = seen[Math.max(0, seen.length - 1 - settings().proxies)];
  return (address || "unknown").slice(0, mostCharacters);
}
