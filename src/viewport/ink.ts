import { useEffect, useState } from 'react';

/** The drawing's colours as the style sheet has them now: light film or dark board. */
export interface Ink {
  film: string;
  sheet: string;
  ink: string;
  ink2: string;
  hair: string;
  line: string;
  wash: string;
  datum: string;
}

export function useInk(): Ink {
  const [ink, setInk] = useState(readInk);
  useEffect(() => {
    const dark = window.matchMedia('(prefers-color-scheme: dark)');
    const change = () => setInk(readInk());
    dark.addEventListener('change', change);
    return () => dark.removeEventListener('change', change);
  }, []);
  return ink;
}

function readInk(): Ink {
  const style = getComputedStyle(document.documentElement);
  const of = (name: string) => style.getPropertyValue(`--${name}`).trim();
  return {
    film: of('film'),
    sheet: of('sheet'),
    ink: of('ink'),
    ink2: of('ink-2'),
    hair: of('hair'),
    line: of('line'),
    wash: of('wash'),
    datum: of('datum'),
  };
}
