import type { AddressInfo } from "node:net";
import { type ParsedMail, simpleParser } from "mailparser";
import { SMTPServer } from "smtp-server";

interface TestSmtpServer {
  url: string;
  port: number;
  /** What has been taken, in order. */
  mails: ParsedMail[];
  stop(): Promise<void>;
}

/** A real mail server on loopback that keeps what it takes; `refuse` makes it turn every mail away. */
export async function startSmtpServer({ port = 0, refuse = false } = {}): Promise<TestSmtpServer> {
  const mails: ParsedMail[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    onData(stream, _session, done) {
      simpleParser(stream).then((mail) => {
        if (refuse) return done(new Error("The letter box is full"));
        mails.push(mail);
        done();
      }, done);
    },
  });
  await new Promise<void>((resolve) => server.listen(port, "127.0.0.1", resolve));
  const taken = (server.server.address() as AddressInfo).port;
  return {
    url: `smtp://127.0.0.1:${taken}`,
    port: taken,
    mails,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
