import { useEffect, useState } from 'react';
import type { NewReading, Reading } from '~/domain/reading/reading';
import { recordReading } from '../shared/api';
import { asProblem } from '../shared/problem';
import { keepUnsent, newKey, unsentReadings, type UnsentReading } from './unsent-readings';

export interface Readings {
  kept: readonly Reading[];
  unsent: readonly UnsentReading[];
  sending: boolean;
  /** What the last attempt came to, in a sentence. */
  said: { ok: boolean; text: string } | null;
  keep(reading: NewReading): Promise<void>;
  sendAgain(): Promise<void>;
  drop(key: string): void;
}

/**
 * Keeps readings: each gets its key before the first attempt and is held in this browser until the
 * server has acknowledged it, through a lost line and a closed page.
 */
export function useReadings(tankId: string, first: readonly Reading[]): Readings {
  const [kept, setKept] = useState(first);
  const [unsent, setUnsent] = useState<readonly UnsentReading[]>([]);
  const [sending, setSending] = useState(false);
  const [said, setSaid] = useState<Readings['said']>(null);
  useEffect(() => setUnsent(unsentReadings(tankId)), [tankId]);

  function hold(readings: readonly UnsentReading[]): boolean {
    setUnsent(readings);
    return keepUnsent(tankId, readings);
  }

  async function send(all: readonly UnsentReading[]): Promise<void> {
    setSending(true);
    setSaid(null);
    let left = all;
    try {
      for (const { key, reading } of all) {
        const answer = await recordReading(tankId, reading, key);
        left = left.filter((one) => one.key !== key);
        hold(left);
        setKept((list) => [answer, ...list.filter(({ id }) => id !== answer.id)]);
        setSaid({ ok: true, text: 'Kept.' });
      }
    } catch (error) {
      const problem = asProblem(error);
      // what is wrong in itself would be refused again; anything else (a slow line, a session that
      // ended, a role that changed) waits under its key
      const refused = problem.status === 400 || problem.status === 422;
      const stored = hold(refused ? left.slice(1) : left);
      setSaid({ ok: false, text: refused ? problem.message : notSent(problem.message, stored) });
    } finally {
      setSending(false);
    }
  }

  return {
    kept,
    unsent,
    sending,
    said,
    keep: (reading) => {
      const all = [...unsent, { key: newKey(), reading }];
      hold(all);
      return send(all);
    },
    sendAgain: () => send(unsent),
    drop: (key) => void hold(unsent.filter((one) => one.key !== key)),
  };
}

function notSent(why: string, stored: boolean): string {
  return stored
    ? `Not sent yet. ${why} The reading waits in this browser, and is stored once however often you send it.`
    : `Not sent yet. ${why} This browser keeps nothing: leave the page open.`;
}
