import type { Assumed } from './assumed.ts';
import type { Surface } from './question.ts';

/** What is taken of ground whose grass or subsoil nobody stated; its friction says what that is worth. */
export function unstatedGround(
  { kind, grass, firmness }: Surface,
  phase: 'takeoff' | 'landing',
): Pick<Assumed, 'name' | 'assumption'>[] {
  const assumed: Pick<Assumed, 'name' | 'assumption'>[] = [];
  if (kind === 'grass' && grass === undefined && firmness !== 'soft') {
    assumed.push({
      name: 'the length of the grass',
      assumption: {
        at: '/runway/surface/grass',
        value: 'long',
        because: `not stated; the longer ${phase}`,
        source: 'Judgement',
      },
    });
  }
  if (kind !== 'paved' && kind !== 'ice' && firmness === undefined) {
    assumed.push({
      name: 'the subsoil',
      assumption: { at: '/runway/surface/firmness', value: 'firm', because: 'not stated', source: 'Judgement' },
    });
  }
  return assumed;
}
