/** Longest name worth comparing; a longer one is no slip of the keyboard. */
const longest = 64;

/**
 * The known names that a wrong one was probably meant to be, nearest first.
 *
 * Case, hyphens, underscores and spaces do not count. Near means: at most one slip in three letters (a letter too many, too
 * few, wrong, or two changed over), or one name beginning with the other.
 *
 * @param most - how many names at most
 */
export function nearestNames(given: string, known: Iterable<string>, most = 3): string[] {
  if (given.length > longest) return [];
  const bare = bareName(given);
  const near: { name: string; slips: number }[] = [];
  for (const name of known) {
    const other = bareName(name);
    const shorter = Math.min(bare.length, other.length);
    const begins = shorter >= 3 && (bare.startsWith(other) || other.startsWith(bare));
    const slips = slipsBetween(bare, other);
    if (slips <= Math.max(1, Math.floor(shorter / 3)) && slips < Math.max(shorter, 1)) near.push({ name, slips });
    else if (begins) near.push({ name, slips: longest + slips });
  }
  return near
    .sort((a, b) => a.slips - b.slips)
    .slice(0, most)
    .map(({ name }) => name);
}

function bareName(name: string): string {
  return name.toLowerCase().replace(/[-_ ]/g, '');
}

/** Fewest insertions, deletions, substitutions and exchanges of neighbours from one text to the other. */
export function slipsBetween(a: string, b: string): number {
  let before: number[] = [];
  let last = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1] ? 0 : 1;
      let least = Math.min((row[j - 1] as number) + 1, (last[j] as number) + 1, (last[j - 1] as number) + same);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]) {
        least = Math.min(least, (before[j - 2] as number) + 1);
      }
      row.push(least);
    }
    before = last;
    last = row;
  }
  return last[b.length] as number;
}
