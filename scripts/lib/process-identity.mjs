import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { spawnSync } from 'node:child_process';

/**
 * A process id alone proves nothing: the system hands it out again. With the moment the process began it names one
 * process for good.
 * @typedef {{ pid: number, began: string }} ProcessIdentity
 */

const hasProc = existsSync('/proc/self/stat');

/**
 * @param {number | string} pid
 * @returns {{ state: string, parent: number, group: number, ticks: string } | undefined}
 */
function procStat(pid) {
  try {
    // The command's name stands in brackets and may hold anything, so count fields from the last bracket.
    const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const fields = text.slice(text.lastIndexOf(')') + 2).split(' ');
    return { state: fields[0] ?? '', parent: Number(fields[1]), group: Number(fields[2]), ticks: fields[19] ?? '' };
  } catch {
    return undefined;
  }
}

/** @param {string[]} fields @param {number} pid */
const ps = (fields, pid) => spawnSync('ps', ['-o', fields.map((field) => `${field}=`).join(','), '-p', String(pid)], { encoding: 'utf8' }).stdout?.trim() ?? '';

/**
 * When the process began, in whatever notation the system has; undefined when it isn't running (a zombie isn't).
 * @param {number} pid
 * @returns {string | undefined}
 */
export function beganAt(pid) {
  if (!hasProc) return ps(['lstart'], pid) || undefined;
  const stat = procStat(pid);
  if (stat === undefined || stat.state === 'Z' || stat.state === 'X') return undefined;
  // Ticks count from the last start of the machine, so that start belongs to the answer.
  return `${readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim()}/${stat.ticks}`;
}

/**
 * @param {number} pid
 * @returns {ProcessIdentity}
 */
export const identityOf = (pid) => ({ pid, began: beganAt(pid) ?? '' });

/** @param {ProcessIdentity} identity */
export const isRunning = ({ pid, began }) => began !== '' && beganAt(pid) === began;

/** @param {number} pid @returns {number} */
export const parentOf = (pid) => (hasProc ? procStat(pid)?.parent : Number(ps(['ppid'], pid))) || 1;

/**
 * The command line of a running process, or nothing when it can't be read.
 * @param {number} pid
 */
export function commandOf(pid) {
  if (!hasProc) return ps(['command'], pid);
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
  } catch {
    return '';
  }
}

/**
 * Whether anything in the process group still runs. Zombies don't count: under an init that doesn't reap, as in many
 * containers, they stay for ever.
 * @param {number} group
 */
export function groupIsRunning(group) {
  if (!hasProc) {
    try {
      process.kill(-group, 0);
      return true;
    } catch {
      return false;
    }
  }
  return readdirSync('/proc').some((entry) => {
    const stat = /^\d+$/.test(entry) ? procStat(entry) : undefined;
    return stat?.group === group && stat.state !== 'Z' && stat.state !== 'X';
  });
}

/**
 * The processes whose environment holds the variable, each with its value and its process group. Empty on a system that
 * doesn't show environments; a process of another user's is passed over.
 * @param {string} variable
 * @returns {{ group: number, value: string }[]}
 */
export function processesMarked(variable) {
  if (!hasProc) return [];
  return readdirSync('/proc').flatMap((entry) => {
    const stat = /^\d+$/.test(entry) ? procStat(entry) : undefined;
    if (stat === undefined) return [];
    try {
      const mark = readFileSync(`/proc/${entry}/environ`, 'utf8').split('\0').find((pair) => pair.startsWith(`${variable}=`));
      return mark === undefined ? [] : [{ group: stat.group, value: mark.slice(variable.length + 1) }];
    } catch {
      return [];
    }
  });
}
