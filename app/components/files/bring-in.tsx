import { type FormEvent, useId, useState } from "react";
import { useFileImport } from "~/hooks/use-file-import";
import type { IncomingKind } from "~/schemas/imports/file-kinds";
import { FileBlank } from "./file-blank";
import { ImportOutcome } from "./import-outcome";
import { KIND_WORDS } from "./kind-words";

/** Choose a kind and a file, or paste rows; see what they would do; bring them in. */
export function BringIn({ kinds }: { kinds: readonly IncomingKind[] }) {
  const [kindName, setKindName] = useState(kinds[0].name);
  const [file, setFile] = useState<File | null>(null);
  const [pasted, setPasted] = useState("");
  const [fault, setFault] = useState<string | null>(null);
  const { phase, tryFile, bringIn, forget } = useFileImport();
  const id = useId();
  const kind = kinds.find(({ name }) => name === kindName) ?? kinds[0];

  function submit(event: FormEvent) {
    event.preventDefault();
    const content = file ?? (pasted.trim() === "" ? null : new Blob([pasted], { type: "text/csv" }));
    setFault(content === null ? "Choose a file, or paste its rows with their header line." : null);
    if (content === null) return;
    tryFile({ kind: kind.name, name: file?.name ?? "pasted rows", content, headers: kind.headers });
  }

  return (
    <section className="sheet min-w-0" aria-labelledby={`${id}-title`}>
      <h2 id={`${id}-title`} className="text-lg">
        Bring a file in
      </h2>
      <form onSubmit={submit} className="mt-3 grid max-w-3xl gap-4">
        <div>
          <label htmlFor={`${id}-kind`} className="font-bold">
            What is in it
          </label>
          <select
            id={`${id}-kind`}
            className="field mt-1"
            value={kind.name}
            onChange={(event) => {
              setKindName(event.target.value as IncomingKind["name"]);
              forget();
            }}
          >
            {kinds.map(({ name }) => (
              <option key={name} value={name}>
                {KIND_WORDS[name].name}
              </option>
            ))}
          </select>
          <p className="mt-1 text-[0.9375rem] text-soft">{KIND_WORDS[kind.name].effect}</p>
          <p className="mt-1 text-[0.9375rem] text-soft">
            Columns: <span className="figure font-semibold text-ink">{kind.required.join(", ")}</span>
            {kind.optional.length > 0 && <span className="figure">, {kind.optional.join(", ")}</span>}. Those
            in bold are needed.
          </p>
        </div>
        <FileBlank
          file={file}
          pasted={pasted}
          fault={fault}
          onFile={(chosen) => {
            setFile(chosen);
            forget();
          }}
          onPaste={(text) => {
            setPasted(text);
            forget();
          }}
        />
        <button type="submit" className="button justify-self-start">
          See what it would do
        </button>
      </form>
      <ImportOutcome
        phase={phase}
        columns={[...kind.required, ...kind.optional]}
        onTry={tryFile}
        onBringIn={bringIn}
      />
    </section>
  );
}
