/**
 * A uuid v7: 48 bits of milliseconds, then random, so that keys made anywhere sort by time.
 *
 * @param now milliseconds since 1970
 * @param random sixteen random bytes; given in tests and in the demo's seed, which must come out the same each time
 * @example newId() // "0192f0c1-…"
 */
export function newId(now: number = Date.now(), random: Uint8Array = crypto.getRandomValues(new Uint8Array(16))): string {
  const bytes = Uint8Array.from(random);
  let rest = now;
  for (let i = 5; i >= 0; i--) {
    bytes[i] = rest % 256;
    rest = Math.floor(rest / 256);
  }
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x70;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-${hex.slice(12, 16)}-${hex.slice(16, 20)}-${hex.slice(20)}`;
}
