import { useRef, useState } from "react";
import { useRevalidator } from "react-router";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { type FileError, sendFile } from "./send-file";

export interface Incoming {
  kind: ImportKindName;
  name: string;
  content: Blob;
  /** Headers matched by hand. */
  headers: Readonly<Record<string, string>>;
}

export type ImportPhase =
  | { at: "waiting" }
  /** `part` of the file is out, from 0 to 1; then the server works on it. */
  | { at: "trying" | "writing"; file: Incoming; part: number }
  | { at: "tried" | "done"; file: Incoming; answer: ImportAnswer }
  | { at: "refused"; file: Incoming; detail: string; errors: FileError[] };

/** A file on its way in: tried first, so that what it would do can be read, then brought in whole or not at all. */
export function useFileImport() {
  const [phase, setPhase] = useState<ImportPhase>({ at: "waiting" });
  const stop = useRef<AbortController>(null);
  const { revalidate } = useRevalidator();

  async function send(file: Incoming, dryRun: boolean) {
    stop.current?.abort();
    const mine = new AbortController();
    stop.current = mine;
    const at = dryRun ? "trying" : "writing";
    setPhase({ at, file, part: 0 });
    const search = new URLSearchParams(dryRun ? { dryRun: "1" } : {});
    if (Object.keys(file.headers).length > 0) search.set("headers", JSON.stringify(file.headers));
    const result = await sendFile<ImportAnswer>({
      address: `/api/imports/${file.kind}?${search}`,
      content: file.content,
      onProgress: (part) => setPhase((now) => (now.at === at ? { ...now, part } : now)),
      signal: mine.signal,
    });
    if (mine.signal.aborted) return;
    if (!result.ok) return setPhase({ at: "refused", file, ...result.problem });
    setPhase({ at: dryRun ? "tried" : "done", file, answer: result.answer });
    if (!dryRun) revalidate();
  }

  function forget() {
    stop.current?.abort();
    setPhase({ at: "waiting" });
  }

  return {
    phase,
    tryFile: (file: Incoming) => send(file, true),
    bringIn: (file: Incoming) => send(file, false),
    forget,
  };
}
