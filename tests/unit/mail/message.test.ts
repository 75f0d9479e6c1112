import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { compose } from "@/lib/mail";
import { oneLine } from "@/lib/mail/message";
import {
  confirmAddress,
  passwordChanged,
  resetPassword,
  somebodyTriedToSignUp,
} from "@/lib/mail/templates";

process.env.APP_URL = "https://estimates.example";

const mail = (more: Partial<Parameters<typeof compose>[0]>) =>
  compose({
    kind: "test",
    recipient: "a@tarn-hollow.example",
    subject: "A subject",
    paragraphs: ["One.", "Two."],
    ...more,
  });

describe("compose", () => {
  it("writes the same in text and in HTML", () => {
    const { text, html } = mail({ link: "https://estimates.example/x?a=1&b=2" });
    expect(text).toBe("One.\n\nTwo.\n\nhttps://estimates.example/x?a=1&b=2\n\nLeading Order\n");
    expect(html).toContain("<p>One.</p>\n<p>Two.</p>");
    expect(html).toContain('href="https://estimates.example/x?a=1&amp;b=2"');
  });

  it("shows markup as text", () => {
    const { html } = mail({ paragraphs: ['<script>alert("&")</script>'] });
    expect(html).toContain("&lt;script&gt;alert(&quot;&amp;&quot;)&lt;/script&gt;");
    expect(html).not.toContain("<script");
  });

  it("keeps headers on one line, whatever is in them", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (typed) => {
        const { recipient, subject } = mail({
          recipient: typed,
          subject: `x${typed}\r\nBcc: b@evil.example`,
        });
        expect(recipient + subject).not.toMatch(/\p{Cc}/u);
      }),
    );
  });
});

describe("oneLine", () => {
  it.each([
    ["a\r\nBcc: b", "a Bcc: b"],
    [" a\u0000\tb\n", "a b"],
    ["a\u0085b", "a b"],
  ])("makes of %j: %j", (text, line) => {
    expect(oneLine(text)).toBe(line);
  });
});

describe("mail to an address that anybody may have typed", () => {
  const typed = { email: "a@tarn-hollow.example", name: "You won! evil.example/prize" };

  it.each([
    ["to confirm it", confirmAddress(typed, "TOKEN"), "/confirm?token=TOKEN"],
    ["to set a new password", resetPassword(typed, "TOKEN"), "/reset/new?token=TOKEN"],
  ])("carries no word of theirs, and one link of ours: %s", (_what, message, path) => {
    for (const part of [message.subject, message.text, message.html]) {
      expect(part).not.toContain("prize");
    }
    expect(message.text.match(/https?:\S+/g)).toEqual([`https://estimates.example${path}`]);
  });
});

describe("mail to the owner of an account", () => {
  const owner = { email: "a@tarn-hollow.example", name: "Maren Lindqvist-Sarr" };

  it.each([
    ["of a second sign-up", somebodyTriedToSignUp(owner)],
    ["of a changed password", passwordChanged(owner)],
  ])("greets by name and leads to a new password: %s", (_what, message) => {
    expect(message.recipient).toBe(owner.email);
    expect(message.text).toMatch(/^Dear Maren Lindqvist-Sarr,/);
    expect(message.text).toContain("https://estimates.example/reset\n");
  });
});
