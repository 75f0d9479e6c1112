import { micromark } from "micromark";
import { math, mathHtml } from "micromark-extension-math";
import { katexSettings } from "./katex-settings";

const set = new Map<string, string>();
const mostSet = 500;

/**
 * A calculation loads nothing from elsewhere, so an image is a link to it. micromark writes its tags
 * in one way only, with everything in them escaped.
 */
function withoutImages(html: string): string {
  return html.replace(
    /<img src="([^"]*)" alt="([^"]*)"[^>]*>/g,
    (_, address: string, words: string) =>
      address === "" ? words : `<a href="${address}">${words || "image"}</a>`,
  );
}

/** CommonMark with `$…$` as HTML. Raw HTML and dangerous links of the text come out as text. */
export function proseHtml(markdown: string): string {
  const known = set.get(markdown);
  if (known !== undefined) return known;
  if (set.size >= mostSet) set.clear();
  const html = withoutImages(
    micromark(markdown, {
      extensions: [math()],
      htmlExtensions: [mathHtml(katexSettings)],
    }),
  );
  set.set(markdown, html);
  return html;
}

/** Prose of a calculation, in the serif. */
export function Prose({ markdown }: { markdown: string }) {
  // micromark leaves out raw HTML and unsafe protocols unless told otherwise, and it is not.
  // biome-ignore lint/security/noDangerouslySetInnerHtml: see above.
  return <div className="prose" dangerouslySetInnerHTML={{ __html: proseHtml(markdown) }} />;
}
