import { afterEach, expect, it, vi } from 'vitest';
import { carriedDraft, carryDraft } from '~/islands/front/carried-draft';
import { firstHull, vHull } from '~/islands/front/v-hull';
import { settleDraft } from '~/islands/sign-up/settle-draft';
import { json, problem, sent } from '../shared/answers';

const fetch = vi.fn<(...args: unknown[]) => Promise<Response>>();
vi.stubGlobal('fetch', fetch);
afterEach(() => {
  fetch.mockReset();
  localStorage.clear();
});

const hull = vHull({ ...firstHull, depthMm: 450 });

it('makes the carried hull a tank of the new workshop and leads to its bench', async () => {
  carryDraft(hull);
  const settings = {
    liquid: 'diesel',
    densityKgPerM3: null,
    safeFillPercent: 95,
    outletMm: null,
    referenceHeightMm: null,
    measuredBy: 'tape',
    sizePlusMinusMm: 2,
    dipPlusMinusMm: 2,
  };
  const tank = {
    id: 't1',
    installationId: 'i1',
    installationName: 'Skua',
    name: 'V hull',
    settings,
    revision: null,
    draftDiffers: true,
  };
  fetch
    .mockResolvedValueOnce(json(201, { id: 'i1', name: 'Skua', kind: 'boat' }))
    .mockResolvedValueOnce(json(201, tank));
  expect(await settleDraft('Skua')).toBe('/tanks/t1/bench');
  expect(sent(fetch.mock.calls, 0).body).toEqual({ name: 'Skua', kind: 'boat' });
  expect(sent(fetch.mock.calls, 1).body).toMatchObject({
    installationId: 'i1',
    liquid: 'diesel',
    design: hull,
  });
  expect(carriedDraft()).toBeNull();
});

it('keeps the draft for the home when something fails on the way', async () => {
  carryDraft(hull);
  fetch.mockResolvedValueOnce(problem(503, { code: 'unavailable', detail: 'away' }));
  expect(await settleDraft('Skua')).toBe('/home#new-tank');
  expect(carriedDraft()?.design).toEqual(hull);
});

it('goes home without a draft, and takes nothing that is no design', async () => {
  expect(await settleDraft(undefined)).toBe('/home');
  localStorage.setItem(
    'dipwright.carried-draft',
    '{"design":{"format":"other"},"liquid":"diesel"}',
  );
  expect(await settleDraft('Skua')).toBe('/home');
  expect(fetch).not.toHaveBeenCalled();
});
