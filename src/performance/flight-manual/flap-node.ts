/** Flap angles nearer to each other than this are one setting [rad]. */
const sameFlap = 1e-6;

/** The place of a flap setting among those of a sheet, which is never read between two. */
export function flapNode(nodes: readonly number[], flap: number): number | undefined {
  const met = nodes.findIndex((node) => Math.abs(node - flap) <= sameFlap);
  return met < 0 ? undefined : met;
}

/** The setting nearest to one that is not there, and the side on which that lies. */
export function nearestFlap(nodes: readonly number[], flap: number) {
  let nearest = 0;
  for (let i = 1; i < nodes.length; i++) {
    if (Math.abs((nodes[i] as number) - flap) < Math.abs((nodes[nearest] as number) - flap)) nearest = i;
  }
  const bound = nodes[nearest] as number;
  return { node: nearest, bound, side: flap < bound ? ('below' as const) : ('above' as const) };
}
