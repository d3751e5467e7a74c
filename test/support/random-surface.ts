import { contaminantDepth } from '../../src/contract/quantities.ts';
import { surface } from '../../src/contract/runway.ts';
import { contaminantKinds, surfaceKinds, surfaceStates } from '../../src/planning/question.ts';
import { boundsAt } from './bounds-at.ts';
import type { Dice } from './dice.ts';
import { anyQuantity, inSi, quantityOf } from './random-quantity.ts';

/** What has a depth. */
const yielding = ['water', 'slush', 'wet-snow', 'dry-snow'];

/** A surface whose state goes with what lies on it. */
export function randomSurface(dice: Dice): object {
  const { pick, maybe, within } = dice;
  const kind = pick(surfaceKinds);
  return {
    kind,
    ...randomState(dice),
    ...maybe(kind === 'grass' ? 0.7 : 0, () => ({ grass: pick(['short', 'long']) })),
    ...maybe(kind === 'paved' ? 0 : 0.5, () => ({ firmness: pick(['firm', 'soft']) })),
    ...maybe(0.2, () => ({ rollingFrictionCoefficient: within(...boundsAt(surface, 'rollingFrictionCoefficient')) })),
    ...maybe(0.2, () => ({ brakingFrictionCoefficient: within(...boundsAt(surface, 'brakingFrictionCoefficient')) })),
  };
}

/** The state, and in one of five what covers the runway, which the state does not contradict. */
function randomState(dice: Dice): object {
  const state = dice.pick(surfaceStates);
  if (state !== 'contaminated') return { state };
  const kind = dice.pick(contaminantKinds);
  if (!yielding.includes(kind)) return { state, contaminant: { kind } };
  const depth = dice.chance(0.5)
    ? anyQuantity(dice, contaminantDepth)
    : quantityOf(dice, contaminantDepth, 'length', dice.between(0, 0.03));
  const deep = inSi('length', depth) > 0.003;
  return {
    state: dice.pick(deep ? ['contaminated', 'flooded'] : ['contaminated', 'wet', 'damp']),
    contaminant: { kind, depth },
  };
}
