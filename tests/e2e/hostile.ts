import type { Page } from "@playwright/test";
import type { CalculationFile } from "@/lib/schema";

/** Markup that would act if it were believed; each part sets a mark where it gets through. */
export const script = "<script>window.reached = 1; alert(1)</script>";
export const image = '<img src="x" onerror="window.reached = 2; alert(2)">';
export const quote = '" onmouseover="window.reached = 3" autofocus onfocus="alert(3)';

const link = "[a link](javascript:alert(4)) ![an image](javascript:alert(5)) <javascript:alert(6)>";
const drawing =
  '<svg onload="alert(7)"><a xlink:href="javascript:alert(8)"><text>x</text></a></svg>';
const frame = '<iframe srcdoc="<script>parent.reached = 9</script>"></iframe>';
const mathematics = [
  "$\\href{javascript:alert(10)}{x}$",
  "$\\url{javascript:alert(11)}$",
  "$\\includegraphics{https://images.example/x.png}$",
  "$\\htmlData{reached=1}{x}$",
  "$\\htmlStyle{position:fixed}{x}$",
  "$\\def\\a{\\a\\a}\\a$",
  "$\\gdef\\b#1{#1#1#1#1}\\b{\\b{\\b{\\b{\\b{\\b{\\b{\\b{x}}}}}}}}$",
].join(" ");

export const everything = [script, image, quote, link, drawing, frame, mathematics].join("\n\n");

/** A calculation that carries the markup wherever it has room for words. */
export const hostileFile: CalculationFile = {
  format: "leading-order/1",
  title: `${script} ${image}`,
  abstract: everything,
  edition: "codata-2022",
  cells: [
    { id: "text", kind: "text", markdown: everything },
    { id: "given", kind: "given", symbol: image, value: 1, note: everything, source: everything },
    { id: "unit", kind: "given", symbol: "M", value: 1, unit: image, source: quote },
    { id: "relation", kind: "relation", symbol: script, formula: everything, note: everything },
    { id: "tex", kind: "relation", symbol: "\\href{javascript:alert(12)}{y}", formula: "M" },
    { id: "check", kind: "check", condition: `${image} > 1`, because: everything },
  ],
};

/** What a page did that hostile text must not make it do. */
export interface Watch {
  readonly happened: string[];
}

/** Notes dialogs, refused scripts, and requests to other places; call before the page is opened. */
export async function watch(page: Page, origin: string): Promise<Watch> {
  const happened: string[] = [];
  await page.exposeFunction("tellViolation", (what: string) => happened.push(`policy: ${what}`));
  await page.addInitScript(() => {
    const tell = (window as unknown as { tellViolation: (what: string) => void }).tellViolation;
    document.addEventListener("securitypolicyviolation", (event) => {
      tell(`${event.violatedDirective} ${event.blockedURI} ${event.sample}`);
    });
  });
  page.on("dialog", (dialog) => {
    happened.push(`dialog: ${dialog.message()}`);
    void dialog.dismiss();
  });
  page.on("console", (message) => {
    if (/content security policy/i.test(message.text())) happened.push(message.text());
  });
  page.on("request", (request) => {
    const url = request.url();
    if (!url.startsWith(origin) && !/^(data|blob):/.test(url)) happened.push(`request: ${url}`);
  });
  return { happened };
}

/** Elements and attributes that the hostile text asked for and that stand in the page all the same. */
export function smuggled(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const reached = (window as { reached?: number }).reached;
    const found = [...document.querySelectorAll("main *")].filter(
      (element) =>
        // An image whose address was refused keeps its words and loads nothing.
        element.matches(
          "img:not([src='']), iframe, script:not([nonce]), [data-reached], [autofocus]",
        ) ||
        [...element.attributes].some(
          ({ name, value }) =>
            name.startsWith("on") || (name !== "value" && /^\s*javascript:/i.test(value)),
        ) ||
        (element.closest(".katex") !== null && element.matches("a, [style*=fixed]")),
    );
    const tags = found.map((element) => element.outerHTML.slice(0, 120));
    return reached === undefined ? tags : [...tags, `script ${reached} was run`];
  });
}
