import nodemailer from "nodemailer";
import { settings } from "@/lib/settings";
import { dueMail, markFailed, markSent, type WaitingMail } from "./outbox";

const batch = 20;
/** A mail server that is slower than this is tried again later. */
const patience = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 30_000 };

type Send = (mail: WaitingMail) => Promise<void>;

function smtp(url: string, from: string): Send {
  const transport = nodemailer.createTransport({ url, ...patience });
  return async ({ recipient, subject, text, html }) => {
    // As an object, the address is taken as it stands and not read as a list.
    await transport.sendMail({ from, to: { name: "", address: recipient }, subject, text, html });
  };
}

/** How mail leaves: by SMTP; locally it stays in the outbox, which a page shows; else not at all. */
function sender(): Send | undefined {
  const { mailUrl, mailFrom, localMail } = settings();
  if (mailUrl !== undefined) return smtp(mailUrl, mailFrom);
  return localMail ? async () => {} : undefined;
}

/** Send what is due. A mail that fails waits longer each time; none is lost. */
export async function deliverDueMail(): Promise<number> {
  const send = sender();
  if (!send) return 0;
  const mails = await dueMail(batch);
  for (const mail of mails) {
    try {
      await send(mail);
      await markSent(mail.id);
    } catch (error) {
      await markFailed(mail, error);
    }
  }
  return mails.length;
}
