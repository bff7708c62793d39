import bwipjs from "bwip-js/node";
import { Secret, TOTP } from "otpauth";
import { RecoveryCode } from "~/db/models/people/recovery-code";
import { SecondFactor } from "~/db/models/people/second-factor";
import { ownId } from "../account/own-id";
import type { CurrentPerson } from "../current-person";
import { openSecret } from "./seal-secret.server";

export interface SecondFactorFacts {
  state: "off" | "begun" | "on";
  /** What the authenticator reads, while it has not been confirmed. */
  setUp: { picture: string; secret: string } | null;
  recoveryCodesLeft: number;
}

/** How one's second factor stands; once it is on, nobody sees its secret again. */
export async function getSecondFactor(person: CurrentPerson): Promise<SecondFactorFacts> {
  const personId = ownId(person);
  const factor = await SecondFactor.findByPk(personId);
  if (!factor) return { state: "off", setUp: null, recoveryCodesLeft: 0 };
  if (factor.confirmedAt) {
    const recoveryCodesLeft = await RecoveryCode.count({ where: { personId, usedAt: null } });
    return { state: "on", setUp: null, recoveryCodesLeft };
  }
  const secret = openSecret(personId, factor.sealedSecret);
  const label = person.email ?? person.name;
  const address = new TOTP({ issuer: "Cotterpin", label, secret: Secret.fromBase32(secret) }).toString();
  const svg = bwipjs.toSVG({
    bcid: "qrcode",
    text: address,
    scale: 3,
    padding: 4,
    backgroundcolor: "FFFFFF",
  });
  const picture = `data:image/svg+xml;base64,${Buffer.from(svg).toString("base64")}`;
  return {
    state: "begun",
    setUp: { picture, secret: (secret.match(/.{1,4}/g) ?? []).join(" ") },
    recoveryCodesLeft: 0,
  };
}
