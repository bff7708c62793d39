const MONTHS = [
  "January",
  "February",
  "March",
  "April",
  "May",
  "June",
  "July",
  "August",
  "September",
  "October",
  "November",
  "December",
];

const DAY = 86_400_000;
const YEAR_NEEDED_AFTER_DAYS = 300;

interface FormatDateOptions {
  /** The shop's day; without it the year is always shown. */
  today?: string;
  /** `4 Mar` in tables, `4 March` in sentences. */
  short?: boolean;
}

/**
 * An ISO date in words: `14 March`. The year is left out where no other could be meant: in this calendar
 * year and in the next 300 days. Own month names, so that server and browser write the same.
 */
export function formatDate(iso: string, { today, short = false }: FormatDateOptions = {}): string {
  const [year, month, day] = iso.split("-").map(Number);
  const name = MONTHS[month - 1] ?? "";
  const text = `${day} ${short ? name.slice(0, 3) : name}`;
  return today !== undefined && isNear(iso, today) ? text : `${text} ${year}`;
}

/** Whole days from one ISO date to another. */
export function daysBetween(from: string, to: string): number {
  return Math.round((Date.parse(to) - Date.parse(from)) / DAY);
}

function isNear(iso: string, today: string): boolean {
  if (iso.slice(0, 4) === today.slice(0, 4)) return true;
  const days = daysBetween(today, iso);
  return days >= 0 && days <= YEAR_NEEDED_AFTER_DAYS;
}
