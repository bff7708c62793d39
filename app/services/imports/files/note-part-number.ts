const exponent = /^\d(\.\d+)?E[+-]\d+$/i;
const month = "(jan|feb|mar|apr|may|jun|jul|aug|sep|oct|nov|dec)";
const day = new RegExp(`^(\\d{1,2}-${month}|${month}-\\d{2})$`, "i");

/** Points out a part number that looks as if a spreadsheet had made a number or a date of it. */
export function notePartNumber(partNumber: string): string[] {
  if (!exponent.test(partNumber) && !day.test(partNumber)) return [];
  return [
    `The part number ${partNumber} looks as if a spreadsheet had changed it. If so, format the column as text and type it again.`,
  ];
}
