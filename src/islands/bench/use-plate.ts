import { useEffect, useMemo, useRef, useState } from 'react';
import type { ReadingFrame } from '~/domain/table/preview';
import type { Plate } from '~/viewport/projection';

/** The frame of the picture: its size and what is kept clear above, below and beside the tank, px. */
interface Room {
  width: number;
  height: number;
  above: number;
  below: number;
  beside: number;
}

/**
 * Where the rail of the stick stands in a frame. The tank may reach below the stick's zero or above
 * its end (tilted, or dipped over a step): then the rail gives way, and all of it stays in sight.
 */
export function plateIn(room: Room, frame: ReadingFrame): Plate {
  const stickSpan = frame.heightMm * frame.levelPerReading;
  const under = Math.max(0, frame.zeroLevelMm - frame.lowestLevelMm);
  const over = Math.max(0, frame.highestLevelMm - frame.zeroLevelMm - stickSpan);
  const scale = (room.height - room.above - room.below) / (under + stickSpan + over);
  return {
    width: room.width,
    height: room.height,
    railTop: room.above + over * scale,
    railPx: stickSpan * scale,
    marginX: room.beside,
  };
}

/** Follows the size of the picture's frame: the drawing and the stick share one rail. */
export function usePlate(readingFrame: ReadingFrame | null) {
  const frame = useRef<HTMLDivElement>(null);
  const [room, setRoom] = useState<Room | null>(null);
  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const fit = () => {
      const width = element.clientWidth;
      const narrow = width < 480;
      const height = narrow
        ? Math.round(Math.min(460, Math.max(340, window.innerHeight * 0.52)))
        : Math.round(Math.min(640, Math.max(430, window.innerHeight * 0.62)));
      setRoom((old) =>
        old && old.width === width && old.height === height
          ? old
          : {
              width,
              height,
              above: narrow ? 62 : 84,
              below: narrow ? 58 : 66,
              beside: narrow ? 52 : Math.min(120, width * 0.15),
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
  const plate = useMemo(
    () => (room && readingFrame ? plateIn(room, readingFrame) : null),
    [room, readingFrame],
  );
  return { frame, plate };
}
