/** Somewhere no browser goes: what a path resolves against to see whether it leads elsewhere. */
const here = "http://here.invalid";

const pathOfOurs = /^\/(?![/\\])[\w\-./~?&=%#:@!$'()*+,;]*$/;

/**
 * Where to go after signing in: a path of this product, or the desk. Anything that a browser could
 * read as another host is refused, before and after `.` and `..` are resolved.
 */
export function safeReturnPath(asked: string | null | undefined): string {
  if (!asked || !pathOfOurs.test(asked)) return "/desk";
  const url = new URL(asked, here);
  const path = url.pathname + url.search + url.hash;
  return url.origin === here && pathOfOurs.test(path) ? path : "/desk";
}
