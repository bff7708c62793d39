/** ceil(a / b) of whole numbers, a at least 0 and b above 0. */
export function divideUp(a: bigint, b: bigint): bigint {
  return (a + b - 1n) / b;
}
