import { useEffect, useState } from "react";
import type { ImportAnswer } from "~/schemas/imports/import-answer";

/** The answer line by line, as a file. The writer is loaded when it is asked for. */
export function ReportLink({ name, answer }: { name: string; answer: ImportAnswer }) {
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => () => void (address && URL.revokeObjectURL(address)), [address]);

  async function make() {
    const { writeReport } = await import("./write-report");
    const made = URL.createObjectURL(new Blob([writeReport(answer)], { type: "text/csv" }));
    setAddress(made);
    const link = document.createElement("a");
    link.href = made;
    link.download = `report on ${name.replace(/\.\w+$/, "")}.csv`;
    link.click();
  }

  return (
    <p className="mt-3">
      <button type="button" className="py-2 underline" onClick={make}>
        Download this report
      </button>
    </p>
  );
}
