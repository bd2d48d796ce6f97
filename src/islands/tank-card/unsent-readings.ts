import { z } from 'zod/v4';
import { newReading } from '~/domain/reading/reading';

/**
 * Readings that were not acknowledged yet, kept in this browser with their key, so that sending
 * one again can never store it twice.
 */
const unsentReading = z.object({ key: z.string(), reading: newReading });
export type UnsentReading = z.infer<typeof unsentReading>;

const keyOf = (tankId: string): string => `dipwright.unsent-readings.${tankId}`;

export function unsentReadings(tankId: string): UnsentReading[] {
  try {
    const parsed = z
      .array(unsentReading)
      .safeParse(JSON.parse(localStorage.getItem(keyOf(tankId)) ?? '[]'));
    return parsed.success ? parsed.data : [];
  } catch {
    return [];
  }
}

/** false when the browser keeps nothing: the reading then lasts as long as the page. */
export function keepUnsent(tankId: string, readings: readonly UnsentReading[]): boolean {
  try {
    if (readings.length === 0) localStorage.removeItem(keyOf(tankId));
    else localStorage.setItem(keyOf(tankId), JSON.stringify(readings));
    return true;
  } catch {
    return false;
  }
}

/** 128 random bits; getRandomValues works without a secure context, randomUUID does not. */
export function newKey(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
}
