import net from "node:net";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";

const reasons: Record<string, string> = {
  EADDRINUSE: "is taken by another program",
  EACCES: "may not be used by this user",
  EADDRNOTAVAIL: "is not an address of this machine",
  ENOTFOUND: "is not an address of this machine",
};

/** Asked first of all, before minutes of set-up. */
export function assertPortFree(host: string, port: number): Promise<void> {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.on("error", (error: NodeJS.ErrnoException) => {
      const reason = reasons[error.code ?? ""] ?? `cannot be used (${error.code})`;
      reject(
        new StopSentence(
          `Port ${port} on ${host} ${reason}: choose another, for example PORT=${port + 1} npm start.`,
        ),
      );
    });
    server.listen(port, host, () => server.close(() => resolve()));
  });
}
