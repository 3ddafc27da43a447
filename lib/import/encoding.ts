/** What a spreadsheet saves a CSV in, as `TextDecoder` calls it. */
export const ENCODINGS = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
export type Encoding = (typeof ENCODINGS)[number];

export const ENCODING_NAMES: Readonly<Record<Encoding, string>> = {
  'utf-8': 'UTF-8',
  'utf-16le': 'UTF-16 (Unicode text)',
  'utf-16be': 'UTF-16, high byte first',
  'windows-1252': 'Windows (western European)',
};

/** Enough to know it by; the rest of a file is of the same. */
const LOOKED_AT = 4096;

/**
 * In what a file's text is written. A mark at its beginning says it; without one, UTF-16 shows by the empty halves of plain
 * letters, and what isn't valid UTF-8 is taken for windows-1252, which any bytes are.
 *
 * @param bytes the whole file, or its beginning: a character cut off at the end speaks against nothing
 * @example sniffEncoding(new TextEncoder().encode('Unité')) // 'utf-8'
 */
export function sniffEncoding(bytes: Uint8Array): Encoding {
  const [a, b, c] = bytes;
  if (a === 0xef && b === 0xbb && c === 0xbf) return 'utf-8';
  if (a === 0xff && b === 0xfe) return 'utf-16le';
  if (a === 0xfe && b === 0xff) return 'utf-16be';
  const head = bytes.subarray(0, LOOKED_AT);
  const zeros = [0, 0];
  head.forEach((byte, i) => { if (byte === 0) zeros[i % 2] = (zeros[i % 2] ?? 0) + 1; });
  const [even = 0, odd = 0] = zeros;
  if (Math.max(even, odd) > head.length / 8) return odd >= even ? 'utf-16le' : 'utf-16be';
  try {
    new TextDecoder('utf-8', { fatal: true }).decode(bytes, { stream: true });
    return 'utf-8';
  } catch {
    return 'windows-1252';
  }
}
