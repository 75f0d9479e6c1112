/** Answers nothing: what the server costs by itself, for comparison and for probes. */
export function GET(): Response {
  return new Response(null, { status: 204 });
}
