import { notAsWritten } from '../refusal.ts';

/** Most bytes that one stream may become, and all of a file's together. */
const mostOfOne = 8_000_000;
const mostOfAll = 32_000_000;

/** Given at once: what a few kilobytes become is bounded, where 20 MB can become 20 GB. */
const pieceBytes = 4096;

/** Inflates the streams of one file (RFC 1950), up to limits that no report comes near. */
export class Inflater {
  private left = mostOfAll;

  /** @throws InputError when it isn't deflated data, or becomes too much */
  async inflate(bytes: Uint8Array): Promise<Uint8Array> {
    const most = Math.min(this.left, mostOfOne);
    const chunks: Uint8Array[] = [];
    let length = 0;
    const reader = pieces(bytes).pipeThrough(new DecompressionStream('deflate')).getReader();
    const next = () =>
      reader.read().catch((): never => {
        throw notAsWritten('compressed data in it are damaged');
      });
    for (let { done, value } = await next(); !done; { done, value } = await next()) {
      length += value!.length;
      if (length > most) {
        // What is left of it isn't waited for.
        void reader.cancel().catch(() => undefined);
        throw notAsWritten(`it unpacks to more than ${(most / 1e6).toFixed(0)} MB, which no report does`);
      }
      chunks.push(value!);
    }
    this.left -= length;
    const out = new Uint8Array(length);
    let at = 0;
    for (const chunk of chunks) {
      out.set(chunk, at);
      at += chunk.length;
    }
    return out;
  }
}

function pieces(bytes: Uint8Array): ReadableStream<Uint8Array<ArrayBuffer>> {
  let at = 0;
  return new ReadableStream({
    pull(controller) {
      if (at >= bytes.length) controller.close();
      else controller.enqueue(bytes.slice(at, (at += pieceBytes)));
    },
  });
}
