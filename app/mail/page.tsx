import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { PageBody } from "@/components/site/page-body";
import { Time } from "@/components/ui/time";
import { listLocalMail } from "@/lib/mail";
import { settings } from "@/lib/settings";

export const metadata: Metadata = { title: "Local mail", robots: { index: false } };

/** The text of a mail, with its links to follow. */
function MailText({ text }: { text: string }) {
  const parts = text.split(/(https?:\/\/\S+)/);
  return (
    <p className="whitespace-pre-line">
      {parts.map((part, index) =>
        index % 2 === 1 ? (
          <a key={part} href={part} className="link break-all">
            {part}
          </a>
        ) : (
          part
        ),
      )}
    </p>
  );
}

/** Mail that a local start keeps instead of sending it. */
export default async function MailPage() {
  if (!settings().localMail) notFound();
  const mails = await listLocalMail();
  return (
    <PageBody width="column">
      <h1 className="mb-2 text-3xl">Local mail</h1>
      <p className="mb-8">
        This start has no mail server. What would have been sent is listed here, the newest first.
      </p>
      {mails.length === 0 && <p className="text-faint italic">Nothing was sent yet.</p>}
      {mails.map((mail) => (
        <article key={mail.id} className="border-t border-rule py-6">
          <h2 className="text-xl">{mail.subject}</h2>
          <p className="mb-3 font-sans text-sm text-faint">
            to {mail.recipient}, <Time iso={mail.createdAt} />
          </p>
          <MailText text={mail.text} />
        </article>
      ))}
    </PageBody>
  );
}
