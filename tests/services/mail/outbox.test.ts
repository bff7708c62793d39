import { afterEach, describe, expect, it } from "vitest";
import { inTransaction } from "~/db/in-transaction.server";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import { makeTransport } from "~/services/mail/make-transport.server";
import { queueMail } from "~/services/mail/queue-mail.server";
import { sendDueMail } from "~/services/mail/send-due-mail.server";
import { useTestDatabase } from "../../support/database";
import { startSmtpServer } from "../../support/smtp-server";

const database = useTestDatabase();

const started: { stop(): Promise<void> }[] = [];
afterEach(async () => {
  for (const server of started.splice(0)) await server.stop();
});

async function smtp(options: { port?: number; refuse?: boolean } = {}) {
  const server = await startSmtpServer(options);
  started.push(server);
  return server;
}

const queue = (subject = "A part has come") =>
  inTransaction((transaction) =>
    queueMail({ to: "wren@saltmarsh.example", subject, body: "Ten bearings – für Größe M." }, transaction),
  );

const dueNow = () => database.query("UPDATE outbox SET next_at = NOW(3)");

const read = async (id: number) => (await OutboxMail.findByPk(id, { rejectOnEmpty: true })).get();

const secondsUntil = async (id: number) =>
  Number(
    (
      await database.query("SELECT TIMESTAMPDIFF(SECOND, NOW(3), next_at) AS s FROM outbox WHERE id = ?", [
        id,
      ])
    )[0].s,
  );

describe("the outbox", () => {
  it("sends a mail once, under its Message-ID, in letters of any language", async () => {
    const server = await smtp();
    const id = await queue();
    const { messageId } = await read(id);
    const transport = makeTransport(server.url);
    expect(await sendDueMail({ transport })).toBe(1);
    expect(await sendDueMail({ transport })).toBe(0);
    expect(server.mails).toHaveLength(1);
    const [mail] = server.mails;
    expect(mail.messageId).toBe(messageId);
    expect(mail.subject).toBe("A part has come");
    expect(mail.text?.trim()).toBe("Ten bearings – für Größe M.");
    expect(mail.from?.text).toContain("cotterpin@");
    expect(await read(id)).toMatchObject({ state: "sent", tries: 1, fault: null, leaseUntil: null });
  });

  it("keeps nothing of an act that is taken back, and both of one that is done", async () => {
    const failing = inTransaction(async (transaction) => {
      await queueMail({ to: "wren@saltmarsh.example", subject: "Never", body: "" }, transaction);
      throw new Error("taken back");
    });
    await expect(failing).rejects.toThrow("taken back");
    expect(await OutboxMail.count()).toBe(0);
  });

  it("waits longer after each failure and loses nothing while the mail server is away", async () => {
    const server = await smtp();
    await server.stop();
    started.length = 0;
    const id = await queue();
    const transport = makeTransport(server.url);
    for (const [index, wait] of [60, 120, 240, 480, 960, 1920].entries()) {
      await dueNow();
      await sendDueMail({ transport });
      expect(await read(id)).toMatchObject({ state: "waiting", tries: index + 1 });
      expect(Math.abs((await secondsUntil(id)) - wait)).toBeLessThan(5);
    }
    expect((await read(id)).fault).toMatch(/ECONNREFUSED/);
    expect(await sendDueMail({ transport })).toBe(0);
    const back = await smtp({ port: server.port });
    await dueNow();
    await sendDueMail({ transport });
    expect(back.mails).toHaveLength(1);
    expect(await read(id)).toMatchObject({ state: "sent", tries: 7 });
  });

  it("gives up after eight tries, with the reason, and goes on with the others", async () => {
    const server = await smtp({ refuse: true });
    const id = await queue();
    const transport = makeTransport(server.url);
    for (let tried = 0; tried < 8; tried++) {
      await dueNow();
      await sendDueMail({ transport });
    }
    expect(await read(id)).toMatchObject({ state: "dead", tries: 8 });
    expect((await read(id)).fault).toContain("letter box is full");
    await dueNow();
    expect(await sendDueMail({ transport })).toBe(0);
  });

  it("sends each mail once while four workers stand side by side", async () => {
    const server = await smtp();
    for (let number = 0; number < 24; number++) await queue(`Mail ${number}`);
    await Promise.all(Array.from({ length: 4 }, () => sendDueMail({ transport: makeTransport(server.url) })));
    const subjects = server.mails.map((mail) => mail.subject).sort();
    expect(subjects).toEqual(Array.from({ length: 24 }, (_, number) => `Mail ${number}`).sort());
  });

  it("leaves a mail to whoever holds its lease, and takes it when the lease has run out", async () => {
    const server = await smtp();
    await queue();
    const transport = makeTransport(server.url);
    await database.query("UPDATE outbox SET lease_until = NOW(3) + INTERVAL 1 MINUTE");
    expect(await sendDueMail({ transport })).toBe(0);
    await database.query("UPDATE outbox SET lease_until = NOW(3) - INTERVAL 1 SECOND");
    expect(await sendDueMail({ transport })).toBe(1);
  });

  it("begins no further mail once it is told to stop", async () => {
    const server = await smtp();
    await queue();
    expect(await sendDueMail({ transport: makeTransport(server.url), isStopping: () => true })).toBe(0);
    expect(server.mails).toEqual([]);
  });

  it("lets the local mailbox catch all where no mail server is set", async () => {
    const id = await queue();
    expect(await sendDueMail({ transport: null })).toBe(0);
    expect(await read(id)).toMatchObject({ state: "caught", tries: 0 });
  });

  it("keeps no one-time link of a mail that has left", async () => {
    const server = await smtp();
    const body = "Go to http://127.0.0.1:3000/welcome/abc_DEF-1 now.";
    const id = await inTransaction((transaction) =>
      queueMail({ to: "wren@saltmarsh.example", subject: "Welcome", body }, transaction),
    );
    await sendDueMail({ transport: makeTransport(server.url) });
    expect(server.mails[0].text).toContain("/welcome/abc_DEF-1");
    expect((await read(id)).body).toBe("Go to http://127.0.0.1:3000/welcome/… now.");
  });
});
