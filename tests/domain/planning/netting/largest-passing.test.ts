import { describe, expect, test, vi } from "vitest";
import { largestPassing } from "~/domain/planning/netting/largest-passing";

describe("largestPassing", () => {
  test.each([0, 1, 2, 6, 7, 8, 1000])("finds %i with an end and without", (limit) => {
    const passes = (count: number | bigint) => count <= limit;
    expect(largestPassing(0, 2000, passes)).toBe(limit);
    expect(largestPassing(0, null, passes)).toBe(limit);
  });

  test("goes on from what is known", () => {
    const passes = vi.fn((count: number | bigint) => count <= 7);
    expect(largestPassing(7, 10, passes)).toBe(7);
    expect(passes.mock.calls.every(([count]) => count > 7)).toBe(true);
  });

  test("asks once where the end passes", () => {
    const passes = vi.fn(() => true);
    expect(largestPassing(0, 1_000_000, passes)).toBe(1_000_000);
    expect(passes).toHaveBeenCalledOnce();
  });

  test("asks a million in some forty questions, not one by one", () => {
    const passes = vi.fn((count: number | bigint) => count <= 654_321);
    expect(largestPassing(0, null, passes)).toBe(654_321);
    expect(passes.mock.calls.length).toBeLessThan(50);
  });

  test("passes 2^53", () => {
    const limit = 2n ** 60n + 3n;
    expect(largestPassing(0, null, (count) => count <= limit)).toBe(limit);
  });
});
