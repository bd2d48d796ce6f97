import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import type { Tank } from '~/domain/tank/tank';
import { useDraftSaving } from '~/islands/bench/use-draft-saving';
import { useSettings } from '~/islands/bench/use-settings';
import { Query } from '~/islands/shared/query';
import { json, problem, sent } from '../shared/answers';

const fetch = vi.fn<(...args: unknown[]) => Promise<Response>>();
vi.stubGlobal('fetch', fetch);
beforeEach(() => vi.useFakeTimers());
afterEach(() => {
  cleanup();
  fetch.mockReset();
  vi.useRealTimers();
});
const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));
const lineDown = () => fetch.mockRejectedValueOnce(new TypeError('Failed to fetch'));

const box = (length: number): TankDocument => ({
  format: 'dipwright-tank',
  version: 1,
  name: 'box',
  solids: [{ id: 'body', kind: 'box', role: 'holds', length, width: 450, height: 320 }],
});
const first = box(1000);

describe('saving of the draft', () => {
  const draft = () =>
    renderHook(({ design }) => useDraftSaving('t', design, '"1"'), {
      initialProps: { design: first },
      wrapper: Query,
    });
  const refusal = () => problem(422, { code: 'invalid', detail: 'A length is too long.' });

  it('sends a refused draft once, and the next one without delay', async () => {
    const { result, rerender } = draft();
    fetch.mockResolvedValueOnce(refusal());
    rerender({ design: box(5) });
    await pass(800);
    expect(result.current.saving).toMatchObject({ state: 'unsaved', why: 'A length is too long.' });
    await pass(60_000);
    expect(fetch).toHaveBeenCalledTimes(1);

    fetch.mockResolvedValueOnce(json(200, box(6)));
    rerender({ design: box(6) });
    await pass(800);
    expect(result.current.saving.state).toBe('saved');
    expect(fetch).toHaveBeenCalledTimes(2);
  });

  it('says saved again when a refused change is undone', async () => {
    const { result, rerender } = draft();
    fetch.mockResolvedValueOnce(refusal());
    rerender({ design: box(5) });
    await pass(800);
    rerender({ design: first });
    await pass(800);
    expect(result.current.saving.state).toBe('saved');
    expect(fetch).toHaveBeenCalledTimes(1);
  });

  it('tries again by itself when no answer came', async () => {
    const { result, rerender } = draft();
    lineDown();
    rerender({ design: box(5) });
    await pass(800);
    expect(result.current.saving.state).toBe('unsaved');
    fetch.mockResolvedValueOnce(json(200, box(5)));
    await pass(5000);
    expect(result.current.saving.state).toBe('saved');
  });
});

describe('saving of the settings', () => {
  const tank: Tank = {
    id: 't',
    installationId: 'i',
    installationName: 'Service van 3',
    name: 'Fresh water',
    settings: {
      liquid: 'drinking-water',
      densityKgPerM3: null,
      safeFillPercent: 95,
      outletMm: null,
      referenceHeightMm: null,
      measuredBy: 'tape',
      sizePlusMinusMm: 2,
      dipPlusMinusMm: 2,
    },
    revision: null,
    draftDiffers: false,
  };
  const settings = () => renderHook(() => useSettings(tank), { wrapper: Query });

  it('keeps owing what did not reach the server, and sends it by itself', async () => {
    const { result } = settings();
    lineDown();
    act(() => result.current.change({ outletMm: 10 }));
    await pass(10);
    expect(result.current.saved).toBe(false);
    expect(result.current.unsaved).toMatch(/^No answer from the server/);

    fetch.mockResolvedValueOnce(json(200, tank));
    await pass(5000);
    expect(sent(fetch.mock.calls, 1).body).toEqual({ outletMm: 10 });
    expect(result.current.saved).toBe(true);
    expect(result.current.unsaved).toBeNull();
  });

  it('sends what was lost along with the next change', async () => {
    const { result } = settings();
    lineDown();
    act(() => result.current.change({ outletMm: 10 }));
    await pass(10);
    fetch.mockResolvedValueOnce(json(200, tank));
    act(() => result.current.change({ safeFillPercent: 90 }));
    await pass(10);
    expect(sent(fetch.mock.calls, 1).body).toEqual({ outletMm: 10, safeFillPercent: 90 });
    expect(result.current.saved).toBe(true);
  });

  it('does not repeat a refused change by itself, and says which field it is', async () => {
    const { result } = settings();
    fetch.mockResolvedValueOnce(
      problem(422, {
        code: 'invalid',
        detail: 'Not so.',
        errors: [{ pointer: '/outletMm', detail: 'Too high.' }],
      }),
    );
    act(() => result.current.change({ outletMm: 1e9 }));
    await pass(60_000);
    expect(fetch).toHaveBeenCalledTimes(1);
    expect(result.current.faults).toEqual([{ pointer: '/outletMm', detail: 'Too high.' }]);
  });
});
