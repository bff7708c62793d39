interface Referring {
  happenedAt: string;
  reference: string;
}

/** Gives the orders of the past running numbers, year by year, in the order in which they are first met. */
export function numberReferences<Movement extends Referring>(movements: readonly Movement[]): Movement[] {
  const known = new Map<string, string>();
  const last = new Map<string, number>();
  return movements.map((movement) => {
    const { reference } = movement;
    if (reference === "") return movement;
    if (!known.has(reference)) {
      const series = `${reference.slice(0, 2)}-${movement.happenedAt.slice(2, 4)}`;
      const next = (last.get(series) ?? 0) + 1;
      last.set(series, next);
      known.set(reference, `${series}-${String(next).padStart(4, "0")}`);
    }
    return { ...movement, reference: known.get(reference) ?? "" };
  });
}
