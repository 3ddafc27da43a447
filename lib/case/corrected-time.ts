/**
 * When something was done on a device, by our clock. A device may be wrong about the time, but nothing was done in the
 * future.
 *
 * @param device `deviceAt` by the device's clock, and the milliseconds to add to it to get ours
 * @param receivedAt when we got it
 * @example correctedTime({ deviceAt: '2026-03-02T09:10:00Z', clockOffsetMs: -600_000 }, now) // 09:00
 */
export function correctedTime({ deviceAt, clockOffsetMs }: { deviceAt: string; clockOffsetMs: number }, receivedAt: Date): Date {
  return new Date(Math.min(Date.parse(deviceAt) + clockOffsetMs, receivedAt.getTime()));
}
