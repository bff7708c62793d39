import { type DragEvent, useId, useState } from "react";
import { FieldError } from "~/components/forms/field";

interface FileBlankProps {
  file: File | null;
  pasted: string;
  fault: string | null;
  onFile: (file: File | null) => void;
  onPaste: (text: string) => void;
}

/** A file chosen or dropped, or rows pasted from a sheet. */
export function FileBlank({ file, pasted, fault, onFile, onPaste }: FileBlankProps) {
  const id = useId();
  const [isOver, setIsOver] = useState(false);

  function drop(event: DragEvent) {
    event.preventDefault();
    setIsOver(false);
    const [dropped] = event.dataTransfer.files;
    if (dropped) onFile(dropped);
  }

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: dropping is one more way beside the file field
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
      className={`grid gap-3 border-2 border-dashed p-4 ${isOver ? "border-ink bg-paper" : "border-line"}`}
    >
      <div>
        <label htmlFor={`${id}-file`} className="font-bold">
          CSV file
        </label>
        <input
          id={`${id}-file`}
          type="file"
          accept=".csv,.txt,.tsv,text/csv"
          className="field mt-1"
          aria-describedby={fault ? `${id}-fault` : undefined}
          aria-invalid={fault ? true : undefined}
          onChange={(event) => onFile(event.target.files?.[0] ?? null)}
        />
        {file && (
          <p className="mt-1 text-[0.9375rem] text-soft">
            <span className="figure">{file.name}</span>, {Math.max(1, Math.round(file.size / 1024))} kB
          </p>
        )}
      </div>
      {file === null && (
        <div>
          <label htmlFor={`${id}-rows`} className="font-bold">
            Or paste rows, with their header line
          </label>
          <textarea
            id={`${id}-rows`}
            rows={4}
            spellCheck={false}
            className="field figure mt-1 text-[0.9375rem]"
            value={pasted}
            onChange={(event) => onPaste(event.target.value)}
          />
        </div>
      )}
      {fault && <FieldError id={`${id}-fault`} error={fault} />}
    </div>
  );
}
