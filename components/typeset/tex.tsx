import katex from "katex";
import { katexSettings } from "./katex-settings";

const set = new Map<string, string>();
const mostSet = 2_000;

/** TeX as HTML with MathML; remembered, since most equations of a page do not change. */
export function texHtml(tex: string, display: boolean): string {
  const key = `${display ? "D" : "I"}${tex}`;
  const known = set.get(key);
  if (known !== undefined) return known;
  if (set.size >= mostSet) set.clear();
  const html = katex.renderToString(tex, { ...katexSettings, displayMode: display });
  set.set(key, html);
  return html;
}

/** A piece of typeset mathematics. */
export function Tex({ tex, display = false }: { tex: string; display?: boolean }) {
  // KaTeX escapes everything it is given; with trust off it makes no link and loads nothing.
  // biome-ignore lint/security/noDangerouslySetInnerHtml: see above.
  return <span dangerouslySetInnerHTML={{ __html: texHtml(tex, display) }} />;
}
