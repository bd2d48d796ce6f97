import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Reading } from '~/domain/reading/reading';
import { TankCard } from '~/islands/tank-card/TankCard';
import { json, problem, sent } from '../shared/answers';
import { cistern } from './sloped-cistern';

const fetch = vi.fn<(...args: unknown[]) => Promise<Response>>();
vi.stubGlobal('fetch', fetch);
afterEach(() => {
  cleanup();
  fetch.mockReset();
  localStorage.clear();
});

const kept: Reading = {
  id: 'r1',
  at: '2026-11-30T08:15:00.000Z',
  depthMm: 150,
  volumeL: 55.5,
  usableL: 55.5,
  roomL: 67.5,
  massKg: 55.4,
  plusMinusL: 0.9,
  revision: 'A',
  note: null,
  by: 'Callum Reyes',
};
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));
function readAndKeep(): void {
  fireEvent.change(screen.getByRole('textbox'), { target: { value: '150' } });
  press('Keep this reading');
}

describe('keeping a reading', () => {
  it('sends it once with a key and lists it', async () => {
    fetch.mockResolvedValueOnce(json(201, kept));
    render(<TankCard {...cistern} />);
    readAndKeep();
    expect(await screen.findByText('Kept.')).toBeDefined();
    const { path, headers, body } = sent(fetch.mock.calls, 0);
    expect(path).toBe('/api/v1/tanks/cistern/readings');
    expect(headers['idempotency-key']).toMatch(/^[0-9a-f]{32}$/);
    expect(body).toMatchObject({ depthMm: 150 });
    expect(screen.getByText('Callum Reyes, A')).toBeDefined();
    expect(localStorage.length).toBe(0);
  });

  it('survives a failed send and a closed page, and sends again under the same key', async () => {
    fetch.mockRejectedValueOnce(new TypeError('Failed to fetch'));
    render(<TankCard {...cistern} />);
    readAndKeep();
    expect(await screen.findByText(/^Not sent yet\./)).toBeDefined();
    const first = sent(fetch.mock.calls, 0);

    cleanup();
    render(<TankCard {...cistern} />);
    expect(await screen.findByText('Waiting to be sent')).toBeDefined();
    fetch.mockResolvedValueOnce(json(201, kept));
    press('Send again');
    expect(await screen.findByText('Kept.')).toBeDefined();
    const second = sent(fetch.mock.calls, 1);
    expect(second.headers['idempotency-key']).toBe(first.headers['idempotency-key']);
    expect(second.body).toEqual(first.body);
    expect(screen.queryByText('Waiting to be sent')).toBeNull();
  });

  it('lists an answer that came twice once', async () => {
    fetch.mockResolvedValueOnce(json(201, kept));
    render(<TankCard {...cistern} readings={[kept]} />);
    readAndKeep();
    await screen.findByText('Kept.');
    expect(screen.getAllByText('Callum Reyes, A')).toHaveLength(1);
  });

  it('does not hold back a reading that the server refused: it would be refused again', async () => {
    fetch.mockResolvedValueOnce(
      problem(422, { code: 'invalid', detail: 'Give a depth from 0 to 290 mm.' }),
    );
    render(<TankCard {...cistern} />);
    readAndKeep();
    expect(await screen.findByText('Give a depth from 0 to 290 mm.')).toBeDefined();
    expect(screen.queryByText('Waiting to be sent')).toBeNull();
  });

  it('holds on to a reading while the session or the line is at fault, not the reading', async () => {
    for (const [status, code] of [
      [401, 'unauthenticated'],
      [403, 'forbidden'],
      [408, 'unreadable'],
      [409, 'conflict'],
      [429, 'rate-limited'],
    ] as const) {
      fetch.mockResolvedValueOnce(problem(status, { code, detail: 'Not now.' }));
      render(<TankCard {...cistern} />);
      readAndKeep();
      expect(await screen.findByText(/^Not sent yet\./)).toBeDefined();
      expect(screen.getByText('Waiting to be sent')).toBeDefined();
      cleanup();
      localStorage.clear();
    }
  });

  it('keeps waiting ones in order and drops one only when told to', async () => {
    fetch.mockResolvedValue(problem(503, { code: 'unavailable', detail: 'The database is away.' }));
    render(<TankCard {...cistern} />);
    readAndKeep();
    await screen.findByText(/^Not sent yet\./);
    press('Drop it');
    await waitFor(() => expect(screen.queryByText('Waiting to be sent')).toBeNull());
    expect(localStorage.length).toBe(0);
  });

  it('offers nothing to keep to a role that may not', () => {
    render(<TankCard {...cistern} mayKeep={false} />);
    expect(screen.queryByRole('button', { name: 'Keep this reading' })).toBeNull();
  });
});
