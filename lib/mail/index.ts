export { deliverDueMail } from "./deliver";
export { compose, type MailMessage } from "./message";
export { enqueue, listLocalMail, type WaitingMail } from "./outbox";
