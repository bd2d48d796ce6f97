import type { ChartSketch } from '~/domain/report/chart-report';
import { ink } from './ink';
import type { Pen } from './pen';

export interface SketchFrame {
  x: number;
  top: number;
  width: number;
  height: number;
}

const dimensionRoom = 20;
const headRoom = 26;

/** The elevation with its two outer sizes, the stick from its zero, and the outlet's level. */
export function drawSketch(pen: Pen, sketch: ChartSketch, frame: SketchFrame): void {
  const width = frame.width - dimensionRoom;
  const height = frame.height - headRoom - dimensionRoom;
  const scale = Math.min(width / sketch.widthMm, height / sketch.heightMm);
  const drawnWidth = sketch.widthMm * scale;
  const left = frame.x + dimensionRoom + (width - drawnWidth) / 2;
  const base = frame.top + headRoom + sketch.heightMm * scale;
  const at = (x: number, y: number): [number, number] => [left + x * scale, base - y * scale];
  const caption =
    sketch.view === 'side' ? 'Seen from the side, inside' : 'Seen from the end, inside';
  pen.within(
    'Figure',
    () => {
      pen.word(caption, frame.x, frame.top, { face: 'semibold', size: 8.5 });
      drawDimensions(pen, sketch, at);
    },
    { alt: `${caption}: outline of the tank, ${sketch.widthText} by ${sketch.heightText}` },
  );
  pen.artifact(() => {
    for (const hidden of [true, false]) {
      if (hidden) pen.document.dash(2, { space: 1.6 });
      else pen.document.undash();
      const lines = sketch.lines.filter((line) => line.hidden === hidden);
      drawRuns(pen, lines, at, hidden ? 0.45 : 0.8, hidden ? ink.line : ink.full);
    }
  });
  if (sketch.stick !== null) drawStickOnSketch(pen, sketch.stick, sketch, at);
}

/** Lines that run on from one another as one stroke: corners close, and dashes go on round a curve. */
function drawRuns(
  pen: Pen,
  lines: ChartSketch['lines'],
  at: (x: number, y: number) => [number, number],
  width: number,
  color: string,
): void {
  if (lines.length === 0) return;
  const { document } = pen;
  document.lineWidth(width).strokeColor(color).lineJoin('round').lineCap('butt');
  lines.forEach((line, i) => {
    const last = lines[i - 1];
    if (last?.x2 !== line.x1 || last.y2 !== line.y1) document.moveTo(...at(line.x1, line.y1));
    document.lineTo(...at(line.x2, line.y2));
  });
  document.stroke();
}

function drawStickOnSketch(
  pen: Pen,
  stick: NonNullable<ChartSketch['stick']>,
  sketch: ChartSketch,
  at: (x: number, y: number) => [number, number],
): void {
  const [x, zero] = at(stick.x, stick.zeroY);
  const [, roof] = at(stick.x, stick.roofY);
  pen.artifact(() => {
    pen.line(x, roof - 7, x, zero, 1.6);
    pen.line(x - 4, zero, x + 4, zero, 0.8);
    if (sketch.outletY !== null) {
      const y = at(0, sketch.outletY)[1];
      pen.document.dash(4, { space: 1.5 });
      pen.line(at(0, 0)[0], y, at(sketch.widthMm, 0)[0], y, 0.5);
      pen.document.undash();
    }
  });
  const rightHalf = stick.x > sketch.widthMm / 2;
  const label = 'dip point';
  const size = { size: 7.5 } as const;
  pen.within('P', () =>
    pen.word(label, rightHalf ? x - pen.widthOf(label, size) - 4 : x + 4, roof - 12, size),
  );
}

function drawDimensions(
  pen: Pen,
  sketch: ChartSketch,
  at: (x: number, y: number) => [number, number],
): void {
  const [x1, y1] = at(0, 0);
  const [x2, y2] = at(sketch.widthMm, sketch.heightMm);
  const below = y1 + 9;
  const beside = x1 - 9;
  pen.artifact(() => {
    pen.line(x1 - 3, below, x2 + 3, below, 0.4);
    pen.line(beside, y1 + 3, beside, y2 - 3, 0.4);
    for (const [x, y] of [
      [x1, below],
      [x2, below],
      [beside, y1],
      [beside, y2],
    ] as const) {
      pen.line(x - 2.2, y + 2.2, x + 2.2, y - 2.2, 0.8);
    }
    for (const x of [x1, x2]) pen.line(x, y1 + 3, x, below + 3, 0.3);
    for (const y of [y1, y2]) pen.line(x1 - 3, y, beside - 3, y, 0.3);
  });
  const style = { size: 7.5 } as const;
  const across = sketch.widthText;
  pen.word(across, (x1 + x2 - pen.widthOf(across, style)) / 2, below + 0.5, style);
  const up = sketch.heightText;
  const { document } = pen;
  document.save();
  document.rotate(-90, { origin: [beside, (y1 + y2) / 2] });
  pen.word(up, beside - pen.widthOf(up, style) / 2, (y1 + y2) / 2 - 10, style);
  document.restore();
}
