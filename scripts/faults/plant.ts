import { cpSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Fault } from './faults';

/**
 * Copies the production source and makes one mistake in the copy.
 *
 * @param source lib/diagnose
 * @param target folder that does not exist yet
 * @param fault what to plant; nothing for a faithful copy
 * @throws Error when the fault's text does not stand there exactly once: then it would plant nothing, or too much
 */
export function plant(source: string, target: string, fault?: Fault): void {
  cpSync(source, target, { recursive: true });
  if (!fault) return;
  const path = join(target, fault.file);
  const [before = '', ...after] = readFileSync(path, 'utf8').split(fault.find);
  if (after.length !== 1) {
    throw new Error(`fault "${fault.name}": its text stands ${after.length} times in ${fault.file}, not once`);
  }
  writeFileSync(path, before + fault.replace + after.join(''));
}
