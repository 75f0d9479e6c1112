/**
 * Where to go after signing in: a path of this product, or the desk. Anything that a browser could
 * read as another host is refused.
 */
export function safeReturnPath(asked: string | null | undefined): string {
  if (!asked || !/^\/(?![/\\])[\w\-./~?&=%#:@!$'()*+,;]*$/.test(asked)) return "/desk";
  const url = new URL(asked, "http://here.invalid");
  return url.host === "here.invalid" ? url.pathname + url.search + url.hash : "/desk";
}
