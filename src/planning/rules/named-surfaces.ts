import type { Asked, SurfaceRule } from './rule-set.ts';

/** Tests of a surface that rule sets name; damp counts as wet, and unstated ground as firm. */
type Test = SurfaceRule['holds'];

const clear = ({ surface }: Asked) => surface.contaminant === undefined;
const moist = ({ surface: { state } }: Asked) => state === 'wet' || state === 'damp';
const firm = ({ surface: { firmness } }: Asked) => firmness !== 'soft';

export const dryPavement: Test = (asked) =>
  asked.surface.kind === 'paved' && asked.surface.state === 'dry' && clear(asked);
export const wetPavement: Test = (asked) => asked.surface.kind === 'paved' && moist(asked) && clear(asked);
export const dryGrass: Test = (asked) =>
  asked.surface.kind === 'grass' && asked.surface.state === 'dry' && firm(asked) && clear(asked);
export const wetGrass: Test = (asked) => asked.surface.kind === 'grass' && moist(asked) && firm(asked) && clear(asked);
/** Said to be short. */
export const shortWetGrass: Test = (asked) => wetGrass(asked) && asked.surface.grass === 'short';
/** Neither dry nor wet. */
export const contaminated: Test = ({ isSlippery }) => isSlippery;

const soft = ({ surface: { kind, firmness } }: Asked) => kind !== 'paved' && kind !== 'ice' && firmness === 'soft';
export const softGrass =
  (state: 'dry' | 'wet'): Test =>
  (asked) =>
    asked.surface.kind === 'grass' &&
    soft(asked) &&
    clear(asked) &&
    (state === 'dry' ? asked.surface.state === 'dry' : moist(asked));
/** Soft, whatever it is of. */
export const softGround: Test = (asked) => soft(asked) && clear(asked);
export const snow: Test = ({ surface: { kind, contaminant } }) =>
  contaminant === undefined ? kind === 'snow' : contaminant.kind.endsWith('-snow');
