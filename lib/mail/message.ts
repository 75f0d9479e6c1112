/** A mail as it waits in the outbox: one person, text and HTML. */
export interface MailMessage {
  readonly kind: string;
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

function escapeHtml(text: string): string {
  const entities: Record<string, string> = {
    "&": "&amp;",
    "<": "&lt;",
    ">": "&gt;",
    '"': "&quot;",
  };
  return text.replace(/[&<>"]/g, (ch) => entities[ch] ?? ch);
}

/** One line, whatever was typed: no header can be smuggled in. */
export function oneLine(text: string): string {
  return text.replace(/\p{Cc}+/gu, " ").trim();
}

/** A mail of plain paragraphs, with at most one link, in both parts. */
export function compose(mail: {
  kind: string;
  recipient: string;
  subject: string;
  paragraphs: readonly string[];
  link?: string;
}): MailMessage {
  const { kind, paragraphs, link } = mail;
  const text = [...paragraphs, ...(link ? [link] : []), "Leading Order"].join("\n\n");
  const body = paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`).join("\n");
  const anchor = link ? `<p><a href="${escapeHtml(link)}">${escapeHtml(link)}</a></p>` : "";
  return {
    kind,
    recipient: oneLine(mail.recipient),
    subject: oneLine(mail.subject),
    text: `${text}\n`,
    html: `<!doctype html><html lang="en"><body>${body}\n${anchor}\n<p>Leading Order</p></body></html>`,
  };
}
