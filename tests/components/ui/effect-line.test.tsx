import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { renderToStaticMarkup } from "react-dom/server";
import { expect, test } from "vitest";
import { EffectLine } from "~/components/ui/effect-line";
import type { BookChangeInput } from "~/schemas/planning/effects";

const shown = (change: BookChangeInput | null) =>
  renderToStaticMarkup(
    <QueryClientProvider client={new QueryClient()}>
      <EffectLine change={change} waiting="Choose a kit." />
    </QueryClientProvider>,
  );

test("says what is missing while the change cannot be said, then that it asks, and is read out politely", () => {
  expect(shown(null)).toContain("Choose a kit.");
  const asking = shown({ kitOrders: { cancel: ["KO-1"] } });
  expect(asking).toContain("Asking what this does …");
  expect(asking).not.toContain("Choose a kit.");
  expect(asking).toContain('aria-live="polite"');
});
