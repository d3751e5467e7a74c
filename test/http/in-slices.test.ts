import { describe, expect, it } from 'vitest';
import { inSlices } from '../../src/http/in-slices.ts';
import type { Work } from '../../src/numerics/work.ts';

function* busy(steps: number, milliseconds: number): Work<string> {
  for (let i = 0; i < steps; i++) {
    const until = performance.now() + milliseconds;
    while (performance.now() < until);
    yield;
  }
  return 'done';
}

describe('inSlices', () => {
  it('lets other work in between, and gives the result', async () => {
    let others = 0;
    const beat = setInterval(() => others++, 1);
    expect(await inSlices(busy(40, 2), () => true)).toBe('done');
    clearInterval(beat);
    expect(others).toBeGreaterThan(3);
  });

  it('ends work that nobody waits for', async () => {
    let asked = 0;
    expect(await inSlices(busy(1000, 2), () => ++asked < 3)).toBeUndefined();
    expect(asked).toBe(3);
  });
});
