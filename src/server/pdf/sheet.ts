import type { Paper } from '~/domain/report/chart-options';

/** A sheet of paper in points (1/72 inch) and what its margins leave. */
export interface Sheet {
  width: number;
  height: number;
  left: number;
  right: number;
  top: number;
  bottom: number;
}

const margin = { side: 40, top: 36, bottom: 32 };

/** ISO 216 A4 is 210 × 297 mm, Letter 8 1/2 × 11 in. */
export function sheetOf(paper: Paper): Sheet {
  const [width, height] = paper === 'a4' ? [595.28, 841.89] : [612, 792];
  return {
    width,
    height,
    left: margin.side,
    right: width - margin.side,
    top: margin.top,
    bottom: height - margin.bottom,
  };
}
