import { readEnv } from "~/utils/env";
import { describeError, log } from "~/utils/http-log.server";
import { makeTransport } from "./make-transport.server";
import { sendDueMail } from "./send-due-mail.server";

const INTERVAL_MILLISECONDS = 2_000;

interface MailWorker {
  /** Begins no further mail and waits for the one under way. */
  stop(): Promise<void>;
}

/** Looks into the outbox every two seconds until it is stopped. A fault is logged and the next look tries again. */
export function startMailWorker(): MailWorker {
  const { smtpUrl } = readEnv();
  const transport = smtpUrl ? makeTransport(smtpUrl) : null;
  let stopping = false;
  let timer: NodeJS.Timeout | undefined;
  let underWay: Promise<void> = Promise.resolve();

  const look = async () => {
    try {
      await sendDueMail({ transport, isStopping: () => stopping });
    } catch (error) {
      log.error({ error: describeError(error) }, "the outbox could not be worked off");
    }
    if (!stopping) timer = setTimeout(begin, INTERVAL_MILLISECONDS);
  };
  const begin = () => {
    underWay = look();
  };
  begin();
  return {
    async stop() {
      stopping = true;
      clearTimeout(timer);
      await underWay;
      transport?.close();
    },
  };
}
