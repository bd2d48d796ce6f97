import { StartFault } from '../../../db/local/start-fault.mjs';

/** Throws unless this is Node 20, from 20.11 on: the versions that the packages were run with. */
export function requireNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  if (major === 20 && minor >= 11) return;
  throw new StartFault(
    `Dipwright runs on Node 20 (20.11 or later), and this is Node ${version}.`,
    'Install Node 20, for instance from nodejs.org, then run the command again.',
  );
}
