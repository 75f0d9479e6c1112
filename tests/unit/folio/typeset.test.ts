import { describe, expect, it } from "vitest";
import { proseHtml } from "@/components/typeset/prose";
import { texHtml } from "@/components/typeset/tex";

/** Tags that a page would act upon. */
const active = /<(script|iframe|img|svg|object|embed|form|style|link|meta)\b|\son\w+\s*=/i;

describe("prose", () => {
  it("is CommonMark with mathematics", () => {
    const html = proseHtml("The flow is *thick*, $\\tau \\gg 1$.");
    expect(html).toContain("<em>thick</em>");
    expect(html).toContain("<math");
  });
  it.each([
    "<script>alert(1)</script>",
    "<img src=x onerror=alert(1)>",
    "a <svg onload=alert(1)> b",
    "<iframe srcdoc='<script>1</script>'></iframe>",
    "<style>body{display:none}</style>",
  ])("shows %s as text", (markdown) => {
    const html = proseHtml(markdown);
    expect(html.replace(/&lt;[^&]*&gt;/g, "")).not.toMatch(active);
    expect(html).toContain("&lt;");
  });
  it.each(["javascript:alert(1)", "JaVaScRiPt:alert(1)", "data:text/html,x", "vbscript:x"])(
    "makes no link to %s",
    (address) => {
      expect(proseHtml(`[here](${address})`)).not.toMatch(/href="[^"]+"/);
    },
  );
  it("loads no picture from elsewhere by an address that runs", () => {
    expect(proseHtml("![x](javascript:alert(1))")).not.toMatch(/src="[^"]+"/);
  });
});

describe("mathematics", () => {
  it("carries MathML for those who hear it", () => {
    expect(texHtml("E = m c^2", true)).toContain("<math");
  });
  it.each([
    "\\href{javascript:alert(1)}{x}",
    "\\url{javascript:alert(1)}",
    "\\includegraphics{http://example.org/x.png}",
    "\\htmlData{onclick=alert(1)}{x}",
    "\\htmlClass{x}{y}",
    "\\htmlStyle{color:red}{y}",
    "<img src=x onerror=alert(1)>",
  ])("makes nothing active of %s", (tex) => {
    const html = texHtml(tex, false).replace(/<annotation[^>]*>.*?<\/annotation>/gs, "");
    expect(html).not.toMatch(/href="[^#]|<img|<a\s|data-onclick|\sonerror=(?!.*&gt;)/);
  });
  it("ends an expansion that would not", () => {
    const bomb = "\\def\\a{\\a\\a}\\a";
    expect(texHtml(bomb, false)).toContain("katex-error");
  });
  it("shows a fault instead of failing", () => {
    expect(() => texHtml("\\frac{1", true)).not.toThrow();
  });
});
