import { settings } from "@/lib/settings";
import { compose, type MailMessage, oneLine } from "./message";

interface Addressee {
  readonly email: string;
}

/** Somebody who has confirmed the address: their name is their own, and may stand in the mail. */
interface Owner extends Addressee {
  readonly name: string;
}

/** To an address that anybody may have typed: no word of theirs is sent to it. */
const stranger = "Good day,";

function link(path: string): string {
  return settings().appUrl + path;
}

/** To a new account: confirm the address. */
export function confirmAddress(to: Addressee, token: string): MailMessage {
  return compose({
    kind: "confirm",
    recipient: to.email,
    subject: "Confirm your address for Leading Order",
    paragraphs: [
      stranger,
      "Please confirm this address by the link below. It is good for 48 hours. If you did not sign up, do nothing; the account will stay unconfirmed.",
    ],
    link: link(`/confirm?token=${token}`),
  });
}

/** To the owner of an address that somebody signed up with again. */
export function somebodyTriedToSignUp(to: Owner): MailMessage {
  return compose({
    kind: "sign-up-again",
    recipient: to.email,
    subject: "You already have an account at Leading Order",
    paragraphs: [
      `Dear ${oneLine(to.name)},`,
      "Somebody signed up with this address, which already belongs to your account. If it was you, sign in instead, or set a new password by the link below. If not, there is nothing to do: your account is untouched.",
    ],
    link: link("/reset"),
  });
}

/** To somebody who forgot the password. */
export function resetPassword(to: Addressee, token: string): MailMessage {
  return compose({
    kind: "reset",
    recipient: to.email,
    subject: "Set a new password for Leading Order",
    paragraphs: [
      stranger,
      "By the link below you can set a new password. It is good for one hour and for one use. If you did not ask for it, do nothing.",
    ],
    link: link(`/reset/new?token=${token}`),
  });
}

/** To the owner, after the password was changed. */
export function passwordChanged(to: Owner): MailMessage {
  return compose({
    kind: "password-changed",
    recipient: to.email,
    subject: "Your password for Leading Order was changed",
    paragraphs: [
      `Dear ${oneLine(to.name)},`,
      "The password of your account was changed, and all other sessions were ended. If it was not you, set a new one by the link below at once.",
    ],
    link: link("/reset"),
  });
}
