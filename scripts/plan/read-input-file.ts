import { existsSync } from "node:fs";
import { open } from "node:fs/promises";
import path from "node:path";
import type { NamedFile } from "~/services/imports/files/check-plan-files";
import { BadInput } from "./bad-input";

const mostBytes = 200_000_000;

/** npm changes to the project's folder; a path is meant from where the person stands. */
function locate(name: string): string {
  const folders = [process.env.INIT_CWD, process.cwd()].filter((folder) => folder !== undefined);
  const places = folders.map((folder) => path.resolve(folder, name));
  return places.find((place) => existsSync(place)) ?? places[places.length - 1];
}

const reasons: Record<string, string> = {
  ENOENT: "there is no such file",
  ENOTDIR: "there is no such file",
  EACCES: "the file may not be read by this user",
  EPERM: "the file may not be read by this user",
  EISDIR: "this is a folder, not a file",
  ENAMETOOLONG: "the name is too long for a file",
  ELOOP: "the link leads to itself",
};

async function readBytes(place: string): Promise<Uint8Array> {
  const file = await open(place);
  try {
    const stat = await file.stat();
    if (stat.isDirectory()) throw new BadInput([reasons.EISDIR]);
    if (stat.isCharacterDevice() || stat.isBlockDevice())
      throw new BadInput(["this is a device, not a file"]);
    const chunks: Buffer[] = [];
    let bytes = 0;
    for await (const chunk of file.createReadStream({ autoClose: false })) {
      bytes += chunk.length;
      if (bytes > mostBytes) throw new BadInput([`the file has more than ${mostBytes} bytes`]);
      chunks.push(chunk);
    }
    return Buffer.concat(chunks, bytes);
  } finally {
    await file.close();
  }
}

/** Reads a file named on the command line. Throws BadInput that names file and flag. */
export async function readInputFile(name: string, flag: string): Promise<NamedFile> {
  try {
    return { name, bytes: await readBytes(locate(name)) };
  } catch (error) {
    const code = error instanceof Error && "code" in error ? String(error.code) : "";
    const reason =
      error instanceof BadInput ? error.sentences[0] : (reasons[code] ?? `it cannot be read (${code})`);
    throw new BadInput([`${name}: ${reason}; expected a CSV file after --${flag}.`]);
  }
}
