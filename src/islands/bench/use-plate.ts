import { useEffect, useRef, useState } from 'react';
import type { Plate } from '~/viewport/projection';

/** Follows the size of the picture's frame: the drawing and the stick share one rail. */
export function usePlate() {
  const frame = useRef<HTMLDivElement>(null);
  const [plate, setPlate] = useState<Plate | null>(null);
  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const fit = () => {
      const width = element.clientWidth;
      const narrow = width < 480;
      const height = narrow
        ? Math.round(Math.min(460, Math.max(340, window.innerHeight * 0.52)))
        : Math.round(Math.min(640, Math.max(430, window.innerHeight * 0.62)));
      const railTop = narrow ? 62 : 84;
      setPlate((old) =>
        old && old.width === width && old.height === height
          ? old
          : {
              width,
              height,
              railTop,
              railPx: height - railTop - (narrow ? 58 : 66),
              marginX: narrow ? 52 : Math.min(120, width * 0.15),
            },
      );
    };
    const observer = new ResizeObserver(fit);
    observer.observe(element);
    window.addEventListener('resize', fit);
    return () => {
      observer.disconnect();
      window.removeEventListener('resize', fit);
    };
  }, []);
  return { frame, plate };
}
