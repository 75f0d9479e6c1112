import { describe, expect, it } from "vitest";
import { proseHtml } from "@/components/typeset/prose";

describe("prose", () => {
  it("sets CommonMark and mathematics, with MathML", () => {
    const html = proseHtml("An *estimate* of $L_X$.");
    expect(html).toContain("<em>estimate</em>");
    expect(html).toContain("<math");
  });

  it("shows markup as text and keeps no unsafe address", () => {
    const html = proseHtml('<script>alert(1)</script> [x](javascript:alert(1)) <b onclick="x()">');
    expect(html).not.toMatch(/<script|<b |href="javascript/);
  });

  it("makes a link of an image, and words of one whose address is refused", () => {
    expect(proseHtml("![a map](https://maps.example/1.png)")).toContain(
      '<a href="https://maps.example/1.png">a map</a>',
    );
    expect(proseHtml("![a map](javascript:alert(1))")).toBe("<p>a map</p>");
    expect(proseHtml('![a"b](https://x.example/%22onerror=1)')).not.toMatch(/<img|onerror="/);
  });
});
