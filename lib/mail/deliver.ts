import nodemailer from "nodemailer";
import { settings } from "@/lib/settings";
import { dueMail, markFailed, markSent, type WaitingMail } from "./outbox";

const batch = 20;

type Send = (mail: WaitingMail) => Promise<void>;

/** How mail leaves: by SMTP; locally it stays in the outbox, which a page shows; else not at all. */
function sender(): Send | undefined {
  const { mailUrl, mailFrom, localMail } = settings();
  if (mailUrl === undefined) return localMail ? async () => {} : undefined;
  const transport = nodemailer.createTransport(mailUrl);
  return async (mail) => {
    const { recipient: to, subject, text, html } = mail;
    await transport.sendMail({ from: mailFrom, to, subject, text, html });
  };
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
