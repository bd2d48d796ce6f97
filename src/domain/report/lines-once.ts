import { joinedParts, partsBetween, partWhere, type Part } from './covered-parts';
import { FrameGrid, type Frame, type Stretch } from './frame-grid';

/** A line of a drawing, mm; `hidden` behind a face. */
export interface DrawnLine extends Stretch {
  hidden: boolean;
}

/**
 * Lines without those that lie on others: a hidden line under a seen one is not drawn, nor any twice. Straight runs
 * become one line each, and lines that run on from one another follow each other, so that corners join and dashes
 * do not begin anew at each.
 * @param near mm within which lines are taken to lie on each other
 */
export function linesOnce(lines: readonly DrawnLine[], frame: Frame, near: number): DrawnLine[] {
  const kept: DrawnLine[] = [];
  const grid = new FrameGrid<DrawnLine>(frame);
  const order = lines
    .filter((line) => lengthOf(line) > 1e-3)
    .sort((a, b) => Number(a.hidden) - Number(b.hidden) || lengthOf(b) - lengthOf(a));
  for (const line of order) {
    for (const rest of beside(line, grid.along(line), near)) {
      kept.push(rest);
      grid.addAlong(rest, rest);
    }
  }
  return [false, true].flatMap((hidden) =>
    inRuns(
      kept.filter((line) => line.hidden === hidden),
      2 * near,
    ),
  );
}

/** The parts of a line that do not lie on any of the others. */
function beside(line: DrawnLine, others: Iterable<DrawnLine>, near: number): DrawnLine[] {
  const length = lengthOf(line);
  const covered: Part[] = [];
  for (const other of others) {
    const part = partOn(line, other, near);
    // a mere crossing is short
    if (part && (part[1] - part[0] > 0.999 || (part[1] - part[0]) * length > 20 * near)) {
      covered.push(part);
    }
  }
  if (covered.length === 0) return [line];
  const parts = partsBetween(joinedParts(covered, Math.min(0.1, (2 * near) / length)));
  return parts.flatMap((part) =>
    (part[1] - part[0]) * length > 2 * near ? [partOf(line, part)] : [],
  );
}

function partOn(line: DrawnLine, other: DrawnLine, near: number): Part | null {
  const length = lengthOf(other);
  const [ux, uy] = [(other.x2 - other.x1) / length, (other.y2 - other.y1) / length];
  const place = (x: number, y: number) => {
    const [dx, dy] = [x - other.x1, y - other.y1];
    return { along: dx * ux + dy * uy, off: dx * uy - dy * ux };
  };
  const [a, b] = [place(line.x1, line.y1), place(line.x2, line.y2)];
  return partWhere([
    [near + a.off, near + b.off],
    [near - a.off, near - b.off],
    [a.along, b.along],
    [length - a.along, length - b.along],
  ]);
}

/** A part of a line, its ends as shares of it. */
export function partOf(line: DrawnLine, [from, to]: Part): DrawnLine {
  const at = (a: number, b: number, t: number) => (t === 0 ? a : t === 1 ? b : a + t * (b - a));
  return {
    x1: at(line.x1, line.x2, from),
    y1: at(line.y1, line.y2, from),
    x2: at(line.x1, line.x2, to),
    y2: at(line.y1, line.y2, to),
    hidden: line.hidden,
  };
}

function inRuns(lines: readonly DrawnLine[], near: number): DrawnLine[] {
  const key = (x: number, y: number) => `${Math.round(x / near)} ${Math.round(y / near)}`;
  const left = new Set(lines);
  const at = new Map<string, DrawnLine[]>();
  for (const line of lines) {
    for (const end of [key(line.x1, line.y1), key(line.x2, line.y2)]) {
      const known = at.get(end);
      if (known) known.push(line);
      else at.set(end, [line]);
    }
  }
  const runs: DrawnLine[] = [];
  for (const line of lines) {
    if (!left.delete(line)) continue;
    const run = [line];
    for (;;) {
      const next = straightest(run.at(-1)!);
      if (!next) break;
      run.push(next);
    }
    for (;;) {
      const before = straightest(reversed(run[0]!));
      if (!before) break;
      run.unshift(reversed(before));
    }
    runs.push(...straightened(run));
  }
  return runs;

  /** The line that goes on from the end of another with the least turn, so directed; none when all are drawn. */
  function straightest(line: DrawnLine): DrawnLine | null {
    const end = key(line.x2, line.y2);
    let best: { line: DrawnLine; next: DrawnLine; cos: number } | null = null;
    for (const one of at.get(end) ?? []) {
      if (!left.has(one)) continue;
      const next = key(one.x1, one.y1) === end ? one : reversed(one);
      const cos = cosBetween(line, next);
      if (!best || cos > best.cos) best = { line: one, next, cos };
    }
    if (best) left.delete(best.line);
    return best?.next ?? null;
  }
}

function straightened(run: readonly DrawnLine[]): DrawnLine[] {
  const lines: DrawnLine[] = [];
  for (const line of run) {
    const last = lines.at(-1);
    if (last && cosBetween(last, line) > 1 - 1e-7) {
      lines[lines.length - 1] = { ...last, x2: line.x2, y2: line.y2 };
    } else lines.push(last ? { ...line, x1: last.x2, y1: last.y2 } : line);
  }
  return lines;
}

function cosBetween(a: Stretch, b: Stretch): number {
  const dot = (a.x2 - a.x1) * (b.x2 - b.x1) + (a.y2 - a.y1) * (b.y2 - b.y1);
  return dot / (lengthOf(a) * lengthOf(b));
}

function reversed(line: DrawnLine): DrawnLine {
  return { ...line, x1: line.x2, y1: line.y2, x2: line.x1, y2: line.y1 };
}

function lengthOf({ x1, y1, x2, y2 }: Stretch): number {
  return Math.hypot(x2 - x1, y2 - y1);
}
