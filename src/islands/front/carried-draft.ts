import { z } from 'zod/v4';
import { tankDocument, type TankDocument } from '~/domain/tank/document';

/**
 * The draft that a visitor takes from the front page into a workshop: kept in this browser only,
 * until it has become a tank.
 */
const carried = z.object({ design: tankDocument, liquid: z.literal('diesel') });
export type CarriedDraft = z.infer<typeof carried>;

const key = 'dipwright.carried-draft';

/** false when this browser keeps nothing (private window, full store). */
export function carryDraft(design: TankDocument): boolean {
  try {
    localStorage.setItem(key, JSON.stringify({ design, liquid: 'diesel' }));
    return true;
  } catch {
    return false;
  }
}

export function carriedDraft(): CarriedDraft | null {
  try {
    const parsed = carried.safeParse(JSON.parse(localStorage.getItem(key) ?? 'null'));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

export function dropCarriedDraft(): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // nothing was kept
  }
}
