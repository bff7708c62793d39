const BROWSERS: [RegExp, string][] = [
  [/Edg(e|A|iOS)?\//, "Edge"],
  [/OPR\//, "Opera"],
  [/(Firefox|FxiOS)\//, "Firefox"],
  [/(Chrome|CriOS|Chromium)\//, "Chrome"],
  [/Safari\//, "Safari"],
];

const SYSTEMS: [RegExp, string][] = [
  [/iPhone|iPad/, "iOS"],
  [/Android/, "Android"],
  [/Windows/, "Windows"],
  [/Mac OS X/, "macOS"],
  [/Linux/, "Linux"],
];

/** What a browser calls itself, in words by which a person knows theirs again; null where it tells nothing. */
export function nameBrowser(userAgent: string | null): string | null {
  const find = (list: [RegExp, string][]) => list.find(([sign]) => sign.test(userAgent ?? ""))?.[1];
  const [browser, system] = [find(BROWSERS), find(SYSTEMS)];
  if (!browser) return system ?? null;
  return system ? `${browser} on ${system}` : browser;
}
