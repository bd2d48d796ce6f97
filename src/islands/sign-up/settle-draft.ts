import { carriedDraft, dropCarriedDraft } from '../front/carried-draft';
import { createInstallation, createTank } from '../shared/api';

/**
 * Makes the carried draft a tank of the new workshop and tells the address to go to: its bench, or
 * the workshop home. When something fails the draft stays carried and the home offers it again:
 * the workshop stands by then, so the sign-up itself must not seem to have failed.
 */
export async function settleDraft(installationName: string | undefined): Promise<string> {
  const draft = carriedDraft();
  if (draft === null || installationName === undefined) return '/home';
  try {
    const installation = await createInstallation({ name: installationName, kind: 'boat' });
    const tank = await createTank({
      installationId: installation.id,
      name: draft.design.name,
      liquid: draft.liquid,
      design: draft.design,
    });
    dropCarriedDraft();
    return `/tanks/${encodeURIComponent(tank.id)}/bench`;
  } catch {
    return '/home#new-tank';
  }
}
