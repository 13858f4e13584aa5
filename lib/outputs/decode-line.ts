const utf8 = new TextDecoder('utf-8', { ignoreBOM: true });
const latin1 = new TextDecoder('latin1');

/** The text of bytes [from, to): UTF-8, or Latin-1 where that fails. */
export function decodeLine(bytes: Uint8Array, from: number, to: number): string {
  // A plain line is some times quicker this way than through a TextDecoder.
  if (to - from <= 256 && isAscii(bytes, from, to))
    return String.fromCharCode.apply(null, bytes.subarray(from, to) as Uint8Array & number[]);
  const text = utf8.decode(bytes.subarray(from, to));
  return text.includes('\uFFFD') ? latin1.decode(bytes.subarray(from, to)) : text;
}

function isAscii(bytes: Uint8Array, from: number, to: number): boolean {
  let all = 0;
  for (let i = from; i < to; i++) all |= bytes[i] as number;
  return all < 0x80;
}
