import { groundSlope } from '../planning/ground-slope.ts';
import type { Declared, Runway, RunwayOnFile, Surface } from '../planning/question.ts';
import type { Draft } from './present.ts';
import { si } from './quantity.ts';
import type { RunwayOnWire } from './runway.ts';
import { startAlong, toSlopeProfile } from './to-ground-line.ts';

/**
 * The runway in SI.
 *
 * @param phase - which declared distance the slope of a profile is taken over
 */
export function toRunway(given: RunwayOnWire, phase: 'takeoff' | 'landing'): Runway {
  const runway = {
    designator: given.designator,
    direction: si('angle', given.direction),
    directionReference: given.directionReference,
    elevation: si('length', given.elevation),
    slope: 'profile' in given.slope ? 0 : si('proportion', given.slope),
    surface: toSurface(given.surface),
    start: toStart(given.start),
  } satisfies Runway as Draft<Runway>;
  if (given.magneticVariation !== undefined) runway.magneticVariation = si('angle', given.magneticVariation);
  if (given.lineUp !== undefined) {
    runway.lineUp = { tora: si('length', given.lineUp.tora), asda: si('length', given.lineUp.asda) };
  }
  if (given.declared !== undefined) runway.declared = toDeclared(given.declared);
  if (given.obstacles !== undefined) {
    runway.obstacles = {
      from: given.obstacles.from,
      list: given.obstacles.list.map(({ distance, height }) => ({
        distance: si('length', distance),
        height: si('length', height),
      })),
    };
  }
  if (given.onFile !== undefined) runway.onFile = toOnFile(given.onFile);
  if (!('profile' in given.slope)) return runway;
  const profile = toSlopeProfile(given.slope.profile, startAlong(given));
  return { ...runway, profile, slope: groundSlope(profile, runway, phase) };
}

/** A surface in SI. */
export function toSurface({ contaminant, ...surface }: RunwayOnWire['surface']): Surface {
  if (contaminant === undefined) return surface;
  const { kind, depth } = contaminant;
  return { ...surface, contaminant: depth === undefined ? { kind } : { kind, depth: si('length', depth) } };
}

function toStart(given: RunwayOnWire['start']): Runway['start'] {
  if (given === 'threshold') return { kind: 'threshold' };
  return 'point' in given
    ? { kind: 'point', name: given.point }
    : { kind: 'offset', offset: si('length', given.offset) };
}

function toOnFile({ aerodrome, revision, changed = [], full }: NonNullable<RunwayOnWire['onFile']>): RunwayOnFile {
  return { aerodrome, revision, changed, ...(full === undefined ? {} : { full: toDeclared(full) }) };
}

function toDeclared({ tora, toda, asda, lda }: NonNullable<RunwayOnWire['declared']>): Declared {
  const declared: Draft<Declared> = {};
  if (tora !== undefined) declared.tora = si('length', tora);
  if (toda !== undefined) declared.toda = si('length', toda);
  if (asda !== undefined) declared.asda = si('length', asda);
  if (lda !== undefined) declared.lda = si('length', lda);
  return declared;
}
