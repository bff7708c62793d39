/** What the pages know of a mail. Moments are ISO. */
export interface MailFacts {
  id: number;
  to: string;
  subject: string;
  state: "waiting" | "sent" | "caught" | "dead";
  tries: number;
  createdAt: string;
  nextAt: string;
  fault: string | null;
}
