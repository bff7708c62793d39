/** Symbols of the units of UN/CEFACT Recommendation 20 that a workshop meets; pieces have none. */
const SYMBOLS: Record<string, string> = {
  EA: "",
  C62: "",
  H87: "",
  SET: "sets",
  PR: "pairs",
  MTR: "m",
  MMT: "mm",
  INH: "in",
  FOT: "ft",
  YRD: "yd",
  MTK: "m²",
  FTK: "ft²",
  KGM: "kg",
  GRM: "g",
  LBR: "lb",
  ONZ: "oz",
  LTR: "l",
  MLT: "ml",
  GLL: "gal",
  HUR: "h",
};

/** `KGM` to `kg`, pieces to nothing, and an unknown code to itself. */
export function unitSymbol(code: string): string {
  return Object.hasOwn(SYMBOLS, code) ? SYMBOLS[code] : code;
}
