import { may } from '~/domain/access/permissions';
import type { Role } from '~/domain/access/roles';
import type { Tank } from '~/domain/tank/tank';

/** States by which the home is filtered; also words of its rows. */
export const tankStates = ['draft-only', 'differs', 'issued'] as const;
export type TankState = (typeof tankStates)[number];

export function stateOf(tank: Tank): TankState {
  if (tank.revision === null) return 'draft-only';
  return tank.draftDiffers ? 'differs' : 'issued';
}

/** "draft only", "A issued", "draft differs from A". */
export function stateWords(tank: Tank): string {
  if (tank.revision === null) return 'draft only';
  const { letter } = tank.revision;
  return tank.draftDiffers ? `draft differs from ${letter}` : `${letter} issued`;
}

export interface Owed {
  words: string;
  href: string;
}

/** What this tank waits for, for a member who can do it; null when nothing is owed by them. */
export function nextOwed(tank: Tank, handedOver: boolean, role: Role): Owed | null {
  const page = `/tanks/${tank.id}`;
  const state = stateOf(tank);
  if (state !== 'issued' && may(role, 'revision.issue')) {
    const words = state === 'draft-only' ? 'issue a revision' : 'issue the next revision';
    return { words, href: `${page}/bench` };
  }
  if (state === 'draft-only') return null;
  if (!handedOver && may(role, 'tank.hand-over'))
    return { words: 'hand over', href: `${page}#hand-over` };
  return handedOver ? null : { words: 'print the chart', href: `${page}#paper` };
}
