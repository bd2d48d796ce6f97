import type { TankDocument } from '../tank/document';
import { formatNumber } from '../units/format-number';
import type { View } from './elevation';

/** How the tank must stand for the chart to hold, in words that fit the sketch. */
export function standsSentence({ attitude }: TankDocument, view: View): string {
  const pitch = attitude?.pitch ?? 0;
  const roll = attitude?.roll ?? 0;
  if (pitch === 0 && roll === 0) return 'This chart holds for the tank standing level.';
  const parts = [
    // from the side x runs to the right and y away; from the end y runs to the right and x towards the eye
    slope(pitch, view === 'side' ? ['right end', 'left end'] : ['near end', 'far end']),
    slope(roll, view === 'side' ? ['far side', 'near side'] : ['right side', 'left side']),
  ].filter((part) => part !== null);
  return `This chart holds for the tank standing with ${parts.join(' and ')}, as the sketch shows it.`;
}

function slope(degrees: number, [plus, minus]: readonly [string, string]): string | null {
  if (degrees === 0) return null;
  const size = Math.abs(degrees);
  return `its ${degrees > 0 ? plus : minus} ${formatNumber(size, size % 1 === 0 ? 0 : 1)}° lower`;
}
