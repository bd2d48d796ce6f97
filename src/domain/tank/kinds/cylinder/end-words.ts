import { sizeWords } from '../size-words';
import type { End } from './schema';

const trade = {
  flat: 'flat',
  cone: 'coned',
  dish: 'dished',
  ellipsoid: 'elliptical',
  torisphere: 'torispherical',
} as const;

/** Both ends in one phrase: "dished ends 125", "low end flat, high end coned 80 inward"; null for flat ones. */
export function endWords([low, high]: readonly [End, End]): string | null {
  const [ofLow, ofHigh] = [sizesOf(low), sizesOf(high)];
  if (low.form === high.form && ofLow === ofHigh) {
    return low.form === 'flat' ? null : `${trade[low.form]} ends${ofLow}`;
  }
  return `low end ${trade[low.form]}${ofLow}, high end ${trade[high.form]}${ofHigh}`;
}

function sizesOf(end: End): string {
  if (end.form === 'flat') return '';
  const sizes =
    end.form === 'torisphere'
      ? `${sizeWords(end.crown)} / ${sizeWords(end.knuckle)}`
      : sizeWords(end.depth);
  return ` ${sizes}${end.inward ? ' inward' : ''}`;
}
