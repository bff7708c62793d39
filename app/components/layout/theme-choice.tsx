import { useEffect, useState } from "react";

const CHOICES = [
  { value: "device", label: "As the device" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
] as const;

type Theme = (typeof CHOICES)[number]["value"];

const A_YEAR = 60 * 60 * 24 * 365;

/** Light or dark, kept in a cookie that the server reads, so that no page flashes in the other one. */
export function ThemeChoice() {
  const [theme, setTheme] = useState<Theme>("device");
  useEffect(() => {
    const shown = document.documentElement.dataset.theme;
    if (shown === "light" || shown === "dark") setTheme(shown);
  }, []);

  function choose(next: Theme) {
    setTheme(next);
    if (next === "device") delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = next;
    // biome-ignore lint/suspicious/noDocumentCookie: the Cookie Store API is not in every browser that reads this page.
    document.cookie = `theme=${next}; path=/; max-age=${next === "device" ? 0 : A_YEAR}; samesite=lax`;
  }

  return (
    <fieldset className="mt-4 border-line border-t pt-3">
      <legend className="sr-only">Light or dark</legend>
      {CHOICES.map((choice) => (
        <label key={choice.value} className="flex min-h-9 items-center gap-2">
          <input
            type="radio"
            name="theme"
            value={choice.value}
            checked={theme === choice.value}
            onChange={() => choose(choice.value)}
            className="size-4"
          />
          {choice.label}
        </label>
      ))}
    </fieldset>
  );
}
