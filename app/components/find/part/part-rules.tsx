import type { PartPage } from "~/schemas/find/part-page";
import type { PresentedPart } from "~/schemas/parts/part-answer";
import { formatMoney } from "~/utils/format/format-money";
import { formatNumber } from "~/utils/format/format-number";
import { type Fact, FactList } from "../fact-list";

/** How the part is planned, what it costs and what it weighs. */
export function PartRules({ page }: { page: PartPage }) {
  const { part } = page;
  const facts: Fact[] = [
    { name: "Lead time", value: figure(`${formatNumber(part.leadTimeDays)} ${dayNoun(part.leadTimeDays)}`) },
    { name: "Safety stock", value: figure(formatNumber(part.safetyStock)) },
    { name: "Lot rule", value: lotWords(part) },
    { name: "Yield", value: figure(part.yield) },
    ...costFacts(page),
    ...massFacts(page),
  ];
  return (
    <section aria-labelledby="rules-title" className="sheet">
      <h2 id="rules-title" className="text-lg">
        Planning, {page.seesCosts ? "cost and " : ""}mass
      </h2>
      <FactList facts={facts} />
    </section>
  );
}

const figure = (text: string) => <span className="figure">{text}</span>;

const dayNoun = (days: number) => (days === 1 ? "day" : "days");

function lotWords(part: PresentedPart): string {
  const rules = [
    part.lotRule === "fixed-period" && part.lotDays !== null
      ? `the need of ${part.lotDays} ${dayNoun(part.lotDays)} at a time`
      : "lot for lot",
    part.lotMinimum !== null && `at least ${formatNumber(part.lotMinimum)}`,
    part.lotMultiple !== null && `in multiples of ${formatNumber(part.lotMultiple)}`,
    part.lotMaximum !== null && `at most ${formatNumber(part.lotMaximum)}`,
  ];
  return rules.filter(Boolean).join(", ");
}

function costFacts({ part, rolledUpCost, seesCosts, components }: PartPage): Fact[] {
  if (!seesCosts) return [];
  const own = part.unitCost === null ? "not said" : figure(formatMoney(part.unitCost));
  const facts: Fact[] = [{ name: "Cost of one", value: own }];
  if (components.length > 0 && rolledUpCost !== null)
    facts.push({ name: "Bought parts in one", value: figure(formatMoney(rolledUpCost)) });
  return facts;
}

function massFacts({ part, rolledUpMass, components }: PartPage): Fact[] {
  const own = part.massKg === null ? "not said" : figure(`${formatNumber(part.massKg)} kg`);
  if (part.massKg !== null || components.length === 0 || rolledUpMass === null)
    return [{ name: "Mass of one", value: own }];
  const unknown = rolledUpMass.unknown.length;
  const facts = [
    { name: "Mass of its components", value: figure(`${formatNumber(rolledUpMass.massKg)} kg`) },
  ];
  if (unknown === 0) return facts;
  return [...facts, { name: "Components without a mass", value: figure(formatNumber(unknown)) }];
}
