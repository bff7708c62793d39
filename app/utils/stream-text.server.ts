import { Readable } from "node:stream";

async function* encode(pieces: AsyncIterable<string>): AsyncGenerator<Uint8Array> {
  const encoder = new TextEncoder();
  for await (const piece of pieces) yield encoder.encode(piece);
}

/** Pieces of text as the body of an answer, sent as they come. */
export function streamText(pieces: AsyncIterable<string>): ReadableStream<Uint8Array<ArrayBuffer>> {
  return Readable.toWeb(Readable.from(encode(pieces))) as ReadableStream<Uint8Array<ArrayBuffer>>;
}
