/**
 * Numbering of nodes that keeps the matrix envelope small: reverse Cuthill-McKee
 * (E. Cuthill, J. McKee, Proc. 24th ACM National Conference, 1969; from memory: confirm).
 */

/** `edges` are pairs of nodes below `n`; the result maps each node to its place. */
export function orderNodes(n: number, edges: readonly (readonly [number, number])[]): Int32Array {
  const neighbours: Set<number>[] = Array.from({ length: n }, () => new Set());
  for (const [a, b] of edges) {
    if (a === b) continue;
    neighbours[a]!.add(b);
    neighbours[b]!.add(a);
  }
  const degree = neighbours.map((set) => set.size);
  const byDegree = (a: number, b: number) => degree[a]! - degree[b]! || a - b;
  const visited = new Array<boolean>(n).fill(false);
  const order: number[] = [];
  for (const root of Array.from({ length: n }, (_, i) => i).sort(byDegree)) {
    if (visited[root]) continue;
    visited[root] = true;
    const queue = [root];
    for (let head = 0; head < queue.length; head++) {
      const node = queue[head]!;
      order.push(node);
      for (const next of [...neighbours[node]!].filter((x) => !visited[x]).sort(byDegree)) {
        visited[next] = true;
        queue.push(next);
      }
    }
  }
  const place = new Int32Array(n);
  order.reverse().forEach((node, index) => {
    place[node] = index;
  });
  return place;
}
