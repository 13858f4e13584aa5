/** A stream whose beginning has been looked at; `stream` still yields every byte, once. */
export interface Peeked {
  head: Uint8Array;
  /** The head is the whole content. */
  whole: boolean;
  stream: AsyncIterable<Uint8Array>;
}

/** Reads at least `bytes` bytes (or all there are) from the front without losing them. */
export async function peek(source: AsyncIterable<Uint8Array>, bytes: number): Promise<Peeked> {
  const iterator = source[Symbol.asyncIterator]();
  const chunks: Uint8Array[] = [];
  let length = 0;
  let whole = false;
  while (length < bytes) {
    const next = await iterator.next();
    if (next.done) {
      whole = true;
      break;
    }
    chunks.push(next.value);
    length += next.value.length;
  }
  const head = chunks.length === 1 && chunks[0] ? chunks[0] : concatenate(chunks, length);
  async function* again(): AsyncGenerator<Uint8Array> {
    try {
      if (head.length > 0) yield head;
      while (!whole) {
        const next = await iterator.next();
        if (next.done) return;
        yield next.value;
      }
    } finally {
      await iterator.return?.();
    }
  }
  return { head, whole, stream: again() };
}

function concatenate(chunks: Uint8Array[], length: number): Uint8Array {
  const all = new Uint8Array(length);
  let at = 0;
  for (const chunk of chunks) {
    all.set(chunk, at);
    at += chunk.length;
  }
  return all;
}
