import { earClipping } from './ear-clipping';
import { patchOf, patchTwist, type Loft } from './loft';
import type { Mesh } from './mesh';
import { snapMm } from './tolerance';
import type { Vec3 } from './vec3';

/** A patch whose corners stand off a plane by less is flat. mm */
const flatMm = snapMm;

/** Whether a patch of the loft is twisted, so that its mesh depends on the count of facets. */
export function isTwisted(loft: Loft): boolean {
  return loft.sections.some(
    (section, i) =>
      i + 1 < loft.x.length && section.some((_, j) => patchTwist(patchOf(loft, i, j)) > flatMm),
  );
}

/**
 * A closed mesh of exactly the loft's volume. A twisted patch is cut into a grid, and every cell, which is bilinear
 * again, into four triangles about its middle, the mean of its corners a, b, c, d. That encloses what the cell does:
 * seen from an origin, what lies under the cell is a sum of the four triple products of its corners, all with one
 * weight, since turning the names round (a to b to c to d to a) changes neither the cell nor what is under it; a fan
 * about a is its folding along ac, so is one about c, and those about b and d are the other folding; a fan's
 * volume is linear in its middle, so the fan about the mean is the mean of both foldings, again all four with one weight.
 * Flat cells say that the two weights are the same. Cells double with the facets (a multiple of 16); part volumes err
 * as facets⁻³, below 1e-7 of the whole at 256. A flat patch takes over the divisions of its neighbours at its rim only.
 */
export function loftMesh(loft: Loft, facets: number): Mesh {
  const { sections } = loft;
  const corners = sections[0]!.length;
  const intervals = sections.length - 1;
  const { along, across } = divisions(loft, facets);
  const points: number[] = [];
  const triangles: number[] = [];
  const add = ([x, y, z]: Vec3) => points.push(x, y, z) / 3 - 1;
  const shared = new Map<string, number>();
  const once = (key: string, point: Vec3) => {
    const known = shared.get(key);
    if (known !== undefined) return known;
    const made = add(point);
    shared.set(key, made);
    return made;
  };

  for (let i = 0; i < intervals; i += 1) {
    for (let j = 0; j < corners; j += 1) {
      const patch = patchOf(loft, i, j);
      const [nu, nv] = [across[j]!, along[i]!];
      const vertex = (u: number, v: number): number => {
        const point = bilinear(patch, u / nu, v / nv);
        if (u === nu && (v === 0 || v === nv)) {
          return once(`${v === 0 ? i : i + 1} ${(j + 1) % corners} 0`, point);
        }
        if (v === 0 || v === nv) return once(`${v === 0 ? i : i + 1} ${j} ${u}`, point);
        if (u === 0 || u === nu)
          return once(`${i} ${u === 0 ? j : (j + 1) % corners} ${v} run`, point);
        return once(`${i} ${j} ${u} ${v} inside`, point);
      };
      if (patchTwist(patch) > flatMm) {
        for (let u = 0; u < nu; u += 1) {
          for (let v = 0; v < nv; v += 1) {
            const middle = add(bilinear(patch, (u + 0.5) / nu, (v + 0.5) / nv));
            fan(middle, [vertex(u, v), vertex(u + 1, v), vertex(u + 1, v + 1), vertex(u, v + 1)]);
          }
        }
        continue;
      }
      const rim = rimOf(nu, nv).map(([u, v]) => vertex(u, v));
      if (rim.length > 4) fan(add(bilinear(patch, 0.5, 0.5)), rim);
      else triangles.push(rim[0]!, rim[1]!, rim[2]!, rim[0]!, rim[2]!, rim[3]!);
    }
  }
  cap(0);
  cap(intervals);
  return { positions: Float64Array.from(points), triangles: Uint32Array.from(triangles) };

  function fan(middle: number, rim: readonly number[]) {
    rim.forEach((vertex, k) => triangles.push(middle, vertex, rim[(k + 1) % rim.length]!));
  }

  /** An end section; a triangle of it that has divided sides is fanned about its middle. */
  function cap(i: number) {
    const x = loft.x[i]!;
    for (const cut of earClipping(sections[i]!)) {
      const rim = cut.flatMap((j, k) => {
        const start = shared.get(`${i} ${j} 0`)!;
        if (cut[(k + 1) % 3] !== (j + 1) % corners) return [start];
        const divided = Array.from({ length: across[j]! - 1 }, (_, u) =>
          shared.get(`${i} ${j} ${u + 1}`)!,
        );
        return [start, ...divided];
      });
      if (i === 0) rim.reverse();
      if (rim.length === 3) {
        triangles.push(...rim);
        continue;
      }
      const mean = (part: 0 | 1) => cut.reduce((sum, j) => sum + sections[i]![j]![part], 0) / 3;
      fan(add([x, mean(0), mean(1)]), rim);
    }
  }
}

/** Cells of the grid: along x by interval, across by side; what the most twisted patch there wants. */
function divisions(loft: Loft, facets: number) {
  const { x, sections } = loft;
  const along = x.slice(1).map(() => 1);
  const across = sections[0]!.map(() => 1);
  const ys = sections.flat().map(([y]) => y);
  const zs = sections.flat().map(([, z]) => z);
  const size = Math.max(
    x.at(-1)! - x[0]!,
    Math.max(...ys) - Math.min(...ys),
    Math.max(...zs) - Math.min(...zs),
  );
  along.forEach((_, i) => {
    across.forEach((_side, j) => {
      const twist = patchTwist(patchOf(loft, i, j));
      if (twist <= flatMm) return;
      const cells = Math.ceil(4 * Math.sqrt(twist / size)) * Math.max(1, Math.round(facets / 32));
      along[i] = Math.max(along[i]!, cells);
      across[j] = Math.max(across[j]!, cells);
    });
  });
  return { along, across };
}

function bilinear([a, b, c, d]: readonly [Vec3, Vec3, Vec3, Vec3], u: number, v: number): Vec3 {
  const at = (axis: 0 | 1 | 2) => {
    const low = a[axis] + u * (b[axis] - a[axis]);
    const high = d[axis] + u * (c[axis] - d[axis]);
    return low + v * (high - low);
  };
  return [at(0), at(1), at(2)];
}

/** Grid points round a patch, against the clock. */
function rimOf(nu: number, nv: number): (readonly [number, number])[] {
  const rim: (readonly [number, number])[] = [];
  for (let u = 0; u < nu; u += 1) rim.push([u, 0]);
  for (let v = 0; v < nv; v += 1) rim.push([nu, v]);
  for (let u = nu; u > 0; u -= 1) rim.push([u, nv]);
  for (let v = nv; v > 0; v -= 1) rim.push([0, v]);
  return rim;
}
