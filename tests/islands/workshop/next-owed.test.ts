import { describe, expect, it } from 'vitest';
import type { Role } from '~/domain/access/roles';
import type { Tank } from '~/domain/tank/tank';
import { nextOwed, stateWords } from '~/pages/_home/next-owed';

const settings = {
  liquid: 'diesel',
  densityKgPerM3: null,
  safeFillPercent: 95,
  outletMm: null,
  referenceHeightMm: null,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
} as const;
const draftOnly: Tank = {
  id: 't',
  installationId: 'i',
  installationName: 'Skua',
  name: 'Port',
  settings,
  revision: null,
  draftDiffers: true,
};
const issued: Tank = {
  ...draftOnly,
  draftDiffers: false,
  revision: {
    id: 'r',
    letter: 'B',
    issuedAt: '2026-11-01T00:00:00Z',
    issuedBy: 'Idris Vaughan',
    note: null,
    stepMm: 10,
    heightMm: 500,
    capacityL: 180,
    errorL: 0,
    hash: 'h',
    current: true,
  },
};
const differs: Tank = { ...issued, draftDiffers: true };

describe('what is owed next', () => {
  it('says how a tank stands', () => {
    expect([draftOnly, issued, differs].map(stateWords)).toEqual([
      'draft only',
      'B issued',
      'draft differs from B',
    ]);
  });

  it.each<[Role, Tank, boolean, string | null]>([
    ['designer', draftOnly, false, 'issue a revision'],
    ['manager', differs, true, 'issue the next revision'],
    ['fitter', draftOnly, false, null],
    ['fitter', differs, false, 'hand over'],
    ['fitter', issued, false, 'hand over'],
    ['designer', issued, false, 'print the chart'],
    ['manager', issued, true, null],
  ])('for a %s', (role, tank, handedOver, words) => {
    expect(nextOwed(tank, handedOver, role)?.words ?? null).toBe(words);
  });
});
