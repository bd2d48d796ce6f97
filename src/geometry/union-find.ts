/** Disjoint sets of 0…count−1: `find` gives a set's root, `join` makes two sets one and gives the root. */
export interface UnionFind {
  find(member: number): number;
  join(one: number, other: number): number;
}

export function unionFind(count: number): UnionFind {
  const parent = Uint32Array.from({ length: count }, (_, i) => i);
  const find = (member: number) => {
    let at = member;
    while (parent[at] !== at) {
      parent[at] = parent[parent[at]!]!;
      at = parent[at]!;
    }
    return at;
  };
  return {
    find,
    join(one, other) {
      const root = find(one);
      parent[find(other)] = root;
      return root;
    },
  };
}
