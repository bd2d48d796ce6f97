import { useCallback, useSyncExternalStore } from 'react';
import { z } from 'zod/v4';
import { lengthUnits } from '~/domain/units/length-unit';
import { volumeUnits } from '~/domain/units/volume-unit';

/** Units and paper that one person chose, remembered in this browser. */
const preference = z.object({
  length: z.enum(lengthUnits),
  volume: z.enum(volumeUnits),
  paper: z.enum(['a4', 'letter']),
});
export type UnitsPreference = z.infer<typeof preference>;

const usual: UnitsPreference = { length: 'mm', volume: 'l', paper: 'a4' };
const listeners = new Set<() => void>();
const seen = new Map<string, { text: string | null; value: UnitsPreference }>();
/** Stands in when the browser keeps nothing (private window): the choice then lasts as long as the page. */
const unkept = new Map<string, string>();

const keyOf = (person: string): string => `dipwright.units.${person}`;

/** The choice of a person (an id or an address) and the way to change it; the server renders the usual one. */
export function useUnitsPreference(
  person: string,
): [UnitsPreference, (change: Partial<UnitsPreference>) => void] {
  const value = useSyncExternalStore(
    subscribe,
    () => readPreference(person),
    () => usual,
  );
  const change = useCallback(
    (part: Partial<UnitsPreference>) => {
      keep(keyOf(person), JSON.stringify({ ...readPreference(person), ...part }));
      for (const listener of listeners) listener();
    },
    [person],
  );
  return [value, change];
}

/** The same object as long as the kept text is the same, as React's store contract wants. */
export function readPreference(person: string): UnitsPreference {
  const key = keyOf(person);
  const text = kept(key);
  const last = seen.get(key);
  if (last !== undefined && last.text === text) return last.value;
  const parsed = preference.partial().safeParse(parse(text));
  const value = parsed.success ? { ...usual, ...parsed.data } : usual;
  seen.set(key, { text, value });
  return value;
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('storage', listener);
  };
}

function kept(key: string): string | null {
  try {
    return localStorage.getItem(key) ?? unkept.get(key) ?? null;
  } catch {
    return unkept.get(key) ?? null;
  }
}

function keep(key: string, text: string): void {
  try {
    localStorage.setItem(key, text);
  } catch {
    unkept.set(key, text);
  }
}

function parse(text: string | null): unknown {
  try {
    return text === null ? {} : JSON.parse(text);
  } catch {
    return {};
  }
}
