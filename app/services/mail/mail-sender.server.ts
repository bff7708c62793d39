import { readEnv } from "~/utils/env";
import { ownAddress } from "~/utils/own-address";

/** Who mail comes from: `MAIL_FROM`, else an address at the host that people use. */
export function mailSender(): string {
  return readEnv().mailFrom ?? `Cotterpin <cotterpin@${new URL(ownAddress()).hostname}>`;
}
