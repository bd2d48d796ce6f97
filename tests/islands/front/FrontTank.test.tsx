import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { computePreview } from '~/domain/table/compute-preview';
import type { TankDocument } from '~/domain/tank/document';
import { loadManifold } from '~/geometry/manifold';
import { carriedDraft } from '~/islands/front/carried-draft';
import { FrontTank } from '~/islands/front/FrontTank';

// the worker's own computing, on this thread: happy-dom has no workers
vi.mock('~/workers/preview-client', () => ({
  createPreviewClient: () => ({
    compute: (design: TankDocument) => computePreview(design),
    close: () => {},
  }),
}));

beforeAll(async () => {
  await loadManifold();
  // happy-dom lays nothing out: every box is 900 wide
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(900);
  vi.stubGlobal(
    'ResizeObserver',
    class {
      constructor(private readonly told: () => void) {}
      observe() {
        this.told();
      }
      disconnect() {}
    },
  );
});
afterEach(() => {
  cleanup();
  localStorage.clear();
});

const page = () => document.body.textContent!.replaceAll('\u00a0', ' ');

describe('the front page', () => {
  // worked by hand: V = ½ · 600 · 500 · 1200 = 180 L; half the stick is a quarter of it
  it('computes the hull and moves its wet line', async () => {
    render(<FrontTank signedIn={false} />);
    await waitFor(() => expect(page()).toContain('45.0 L'), { timeout: 5000 });
    expect(page()).toContain('50 % of the stick is 25 % of the tank.');
    expect(page()).toContain('Brim, computed: 180.0 L');
    fireEvent.keyDown(await screen.findByRole('slider'), { key: 'End' });
    expect(page()).toContain('100 % of the stick is 100 % of the tank.');
    fireEvent.keyDown(screen.getByRole('slider'), { key: 'Home' });
    expect(page()).toContain('0 % of the stick is 0 % of the tank.');
  });

  it('computes anew when a size is changed, and asks nonsense back beside the field', async () => {
    render(<FrontTank signedIn={false} />);
    await waitFor(() => expect(page()).toContain('Brim, computed: 180.0 L'), { timeout: 5000 });
    fireEvent.change(screen.getByLabelText('Depth'), { target: { value: '40 cm' } });
    // ½ · 600 · 400 · 1200 = 144 L
    await waitFor(() => expect(page()).toContain('Brim, computed: 144.0 L'), { timeout: 5000 });
    fireEvent.change(screen.getByLabelText('Length'), { target: { value: '-3' } });
    expect(screen.getByLabelText('Length').getAttribute('aria-invalid')).toBe('true');
    expect(page()).toContain('Brim, computed: 144.0 L');
  });

  it('carries the hull as it was changed', async () => {
    const assign = vi.spyOn(window.location, 'assign').mockImplementation(() => {});
    render(<FrontTank signedIn={false} />);
    fireEvent.change(screen.getByLabelText('Depth'), { target: { value: '450' } });
    fireEvent.click(screen.getByRole('button', { name: 'Model your own' }));
    expect(assign).toHaveBeenCalledWith('/sign-up');
    expect(carriedDraft()!.design.solids).toMatchObject([{ height: 450 }, { height: 450 }]);
  });
});
