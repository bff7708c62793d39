import type { KeyboardEvent } from "react";

const STEPS: Record<string, number> = { ArrowDown: 1, ArrowUp: -1 };

/** Up and down go from link to link of a panel; Home and End to the first and the last. */
export function walkLinks(event: KeyboardEvent<HTMLElement>): void {
  const links = [
    ...event.currentTarget.querySelectorAll<HTMLElement>("a[href]:not([tabindex='-1']), button"),
  ];
  if (links.length === 0) return;
  const at = links.indexOf(document.activeElement as HTMLElement);
  const step = STEPS[event.key];
  let next: HTMLElement | undefined;
  if (step !== undefined) next = links[Math.min(Math.max(at + step, 0), links.length - 1)];
  else if (event.key === "Home") next = links[0];
  else if (event.key === "End") next = links.at(-1);
  if (next === undefined) return;
  event.preventDefault();
  next.focus();
}
