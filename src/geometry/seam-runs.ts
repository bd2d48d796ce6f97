import type { FaceEdge } from './flat-faces';

/**
 * Re-entrant edges gathered into runs, each edge beginning where the last one ended, all with the same smooth
 * surface on their left and the same on their right. Where three or more meet, runs end.
 */
export function seamRuns<Edge extends FaceEdge>(
  edges: readonly Edge[],
  surfaceOf: (face: number) => number,
): Edge[][] {
  const directed = edges.map((edge): Edge => {
    const { from, to, left, right } = edge;
    if (surfaceOf(left) <= surfaceOf(right)) return edge;
    return { ...edge, from: to, to: from, left: right, right: left };
  });
  const key = ({ left, right }: Edge, vertex: number) =>
    `${surfaceOf(left)} ${surfaceOf(right)} ${vertex}`;
  const starting = new Map<string, number[]>();
  const ending = new Map<string, number[]>();
  const put = (map: Map<string, number[]>, place: string, e: number) => {
    const list = map.get(place);
    if (list) list.push(e);
    else map.set(place, [e]);
  };
  directed.forEach((edge, e) => {
    put(starting, key(edge, edge.from), e);
    put(ending, key(edge, edge.to), e);
  });
  const only = (list: number[] | undefined) => (list?.length === 1 ? list[0]! : null);
  const next = (e: number): number | null => {
    const place = key(directed[e]!, directed[e]!.to);
    return only(ending.get(place)) === e ? only(starting.get(place)) : null;
  };
  const follows = new Map<number, number>();
  directed.forEach((_, e) => {
    const after = next(e);
    if (
      after !== null &&
      only(starting.get(key(directed[after]!, directed[after]!.from))) === after
    ) {
      follows.set(e, after);
    }
  });
  const followed = new Set(follows.values());
  const done = new Set<number>();
  const runs: Edge[][] = [];
  const walk = (first: number) => {
    const run: Edge[] = [];
    for (let e: number | undefined = first; e !== undefined && !done.has(e); e = follows.get(e)) {
      done.add(e);
      run.push(directed[e]!);
    }
    if (run.length > 0) runs.push(run);
  };
  // open runs from their first edge; what is left goes round
  directed.forEach((_, e) => !followed.has(e) && walk(e));
  directed.forEach((_, e) => walk(e));
  return runs;
}
