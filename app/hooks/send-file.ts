/** What came back for a file: the answer, or why not. */
export type FileAnswer<Answer> =
  | { ok: true; answer: Answer }
  | { ok: false; problem: { detail: string; errors: FileError[] } };

export interface FileError {
  line?: number;
  column?: string;
  value?: string;
  unknownHeader?: true;
  message: string;
}

interface Sending {
  address: string;
  content: Blob;
  /** From 0 to 1 while the file goes out. */
  onProgress: (part: number) => void;
  signal: AbortSignal;
}

const NO_ANSWER = "The server did not answer; nothing was changed. Try again in a moment.";

function readProblem(text: string): { detail: string; errors: FileError[] } {
  try {
    const { detail, errors } = JSON.parse(text) as { detail?: unknown; errors?: FileError[] };
    if (typeof detail === "string") return { detail, errors: errors ?? [] };
  } catch {
    // No answer of ours: a proxy's page, or nothing.
  }
  return { detail: NO_ANSWER, errors: [] };
}

/** Sends a file as `text/csv` and says how much of it is out: `fetch` cannot. */
export function sendFile<Answer>({
  address,
  content,
  onProgress,
  signal,
}: Sending): Promise<FileAnswer<Answer>> {
  return new Promise((resolve) => {
    const request = new XMLHttpRequest();
    request.open("POST", address);
    request.setRequestHeader("Content-Type", "text/csv");
    request.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0);
    request.onload = () =>
      resolve(
        request.status < 300
          ? { ok: true, answer: JSON.parse(request.responseText) as Answer }
          : { ok: false, problem: readProblem(request.responseText) },
      );
    request.onerror = () => resolve({ ok: false, problem: { detail: NO_ANSWER, errors: [] } });
    signal.addEventListener("abort", () => request.abort());
    request.send(content);
  });
}
