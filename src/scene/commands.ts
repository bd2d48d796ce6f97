import type { TankDocument } from '~/domain/tank/document';
import { kindOf, type Solid } from '~/domain/tank/kinds/registry';

type Stick = NonNullable<TankDocument['stick']>;

/**
 * What can be done to a design, as pure functions document → document. None of them validates:
 * the bench keeps a document that cannot be computed and says why.
 */
export function addSolid(document: TankDocument, solid: Solid): TankDocument {
  return { ...document, solids: [...document.solids, solid] };
}

export function removeSolid(document: TankDocument, id: string): TankDocument {
  return {
    ...document,
    solids: document.solids.filter((solid) => solid.id !== id),
  };
}

/** A copy stands beside its original, shifted along x by `shiftMm`. */
export function copySolid(document: TankDocument, id: string, shiftMm: number): TankDocument {
  const index = document.solids.findIndex((solid) => solid.id === id);
  const original = document.solids[index];
  if (!original) return document;
  const [x, y, z] = original.at ?? [0, 0, 0];
  const copy: Solid = {
    ...original,
    id: freeId(document, original.id),
    at: [x + shiftMm, y, z],
  };
  const solids = [...document.solids];
  solids.splice(index + 1, 0, copy);
  return { ...document, solids };
}

export function changeSolid(
  document: TankDocument,
  id: string,
  change: (solid: Solid) => Solid,
): TankDocument {
  return {
    ...document,
    solids: document.solids.map((solid) => (solid.id === id ? change(solid) : solid)),
  };
}

/**
 * Changes what a solid measures. A stick that stood at the middle of the solid stays at its middle: off it, the zero
 * of a round tank would climb the wall.
 */
export function resizeSolid(
  document: TankDocument,
  id: string,
  change: (solid: Solid) => Solid,
): TankDocument {
  const before = document.solids.find((solid) => solid.id === id);
  const after = changeSolid(document, id, change);
  const resized = after.solids.find((solid) => solid.id === id);
  return before && resized ? keepInTheMiddle(after, before, resized) : after;
}

/** Sets one size by its path inside the solid's entry, e.g. `['length']`. */
export function setSize(
  document: TankDocument,
  id: string,
  path: readonly string[],
  valueMm: number,
): TankDocument {
  return resizeSolid(document, id, (solid) => setPath(solid, path, valueMm) as Solid);
}

function keepInTheMiddle(document: TankDocument, before: Solid, after: Solid): TankDocument {
  const { stick } = document;
  const turned = before.turn?.some((degrees) => degrees !== 0) ?? false;
  if (!stick || turned || before.role !== 'holds') return document;
  const at: [number, number] = [...stick.at];
  for (const axis of [0, 1] as const) {
    const middle = middleOf(after, axis);
    // an outline that is half typed may have no middle
    if (!Number.isFinite(middle) || !standsInTheMiddle(stick, before, axis)) continue;
    // in the middle of another one as well: which of them it stands for is not known
    const others = document.solids.filter(({ id, role }) => id !== before.id && role === 'holds');
    if (others.some((other) => standsInTheMiddle(stick, other, axis))) continue;
    at[axis] = middle;
  }
  const moved = at[0] !== stick.at[0] || at[1] !== stick.at[1];
  return moved ? setStick(document, { ...stick, at }) : document;
}

function standsInTheMiddle({ at }: Stick, solid: Solid, axis: 0 | 1): boolean {
  // a mesh is not resized, and may not be here
  return solid.kind !== 'mesh' && Math.abs(at[axis] - middleOf(solid, axis)) < 1e-6;
}

function middleOf(solid: Solid, axis: 0 | 1): number {
  return (solid.at?.[axis] ?? 0) + kindOf(solid).extent(solid)[axis] / 2;
}

export function setPlace(
  document: TankDocument,
  id: string,
  axis: 0 | 1 | 2,
  valueMm: number,
): TankDocument {
  return changeSolid(document, id, (solid) => ({
    ...solid,
    at: withEntry(solid.at ?? [0, 0, 0], axis, valueMm),
  }));
}

export function setTurn(
  document: TankDocument,
  id: string,
  axis: 0 | 1 | 2,
  degrees: number,
): TankDocument {
  return changeSolid(document, id, (solid) => ({
    ...solid,
    turn: withEntry(solid.turn ?? [0, 0, 0], axis, degrees),
  }));
}

export function setRole(document: TankDocument, id: string, role: Solid['role']): TankDocument {
  return changeSolid(document, id, (solid) => ({ ...solid, role }));
}

/** Gives a solid another name; the name is its id, so one that is taken is refused (null). */
export function renameSolid(document: TankDocument, id: string, name: string): TankDocument | null {
  if (name === id) return document;
  if (document.solids.some((solid) => solid.id === name)) return null;
  return changeSolid(document, id, (solid) => ({ ...solid, id: name }));
}

export function setAttitude(
  document: TankDocument,
  attitude: { pitch: number; roll: number },
): TankDocument {
  const { attitude: _old, ...rest } = document;
  return attitude.pitch === 0 && attitude.roll === 0 ? rest : { ...rest, attitude };
}

export function setStick(document: TankDocument, stick: TankDocument['stick']): TankDocument {
  const { stick: _old, ...rest } = document;
  return stick === undefined ? rest : { ...rest, stick };
}

/** Whether sizes are inside or outside ones, with the wall; undefined: not told. */
export function setWall(document: TankDocument, wall: TankDocument['wall']): TankDocument {
  const { wall: _old, ...rest } = document;
  return wall === undefined ? rest : { ...rest, wall };
}

/** A name like the wanted one that no solid has yet: "ramp", "ramp 2", "ramp 3" … */
export function freeId(document: TankDocument, wanted: string): string {
  const taken = new Set(document.solids.map((solid) => solid.id));
  const base = wanted.replace(/ \d+$/, '').slice(0, 56);
  if (!taken.has(base)) return base;
  for (let count = 2; ; count += 1) {
    if (!taken.has(`${base} ${count}`)) return `${base} ${count}`;
  }
}

function setPath(value: unknown, path: readonly string[], leaf: number): unknown {
  const [key, ...rest] = path;
  if (key === undefined) return leaf;
  if (Array.isArray(value)) {
    const copy: unknown[] = [...value];
    copy[Number(key)] = setPath(copy[Number(key)], rest, leaf);
    return copy;
  }
  const entry = (value ?? {}) as Record<string, unknown>;
  return { ...entry, [key]: setPath(entry[key], rest, leaf) };
}

function withEntry(
  triple: [number, number, number],
  axis: 0 | 1 | 2,
  value: number,
): [number, number, number] {
  const copy: [number, number, number] = [...triple];
  copy[axis] = value;
  return copy;
}
