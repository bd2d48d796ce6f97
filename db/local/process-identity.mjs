import { readFileSync } from 'node:fs';

/**
 * Names a running process so that a later process with the same number is not taken for it.
 * @param {number} pid
 * @returns {string | null} null when no such process runs
 */
export function processIdentity(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    const afterName = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    // Third field on: state first, start time (in ticks since boot) twentieth.
    return afterName[0] === 'Z' ? null : `${pid}:${afterName[19]}`;
  } catch {
    return null;
  }
}
