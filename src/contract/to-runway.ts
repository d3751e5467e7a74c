import type { Declared, Runway, Surface } from '../planning/question.ts';
import { si } from './quantity.ts';
import type { RunwayOnWire } from './runway.ts';

/** The runway in SI. */
export function toRunway(given: RunwayOnWire): Runway {
  return {
    designator: given.designator,
    direction: si('angle', given.direction),
    directionReference: given.directionReference,
    ...(given.magneticVariation === undefined ? {} : { magneticVariation: si('angle', given.magneticVariation) }),
    elevation: si('length', given.elevation),
    slope: si('proportion', given.slope),
    surface: given.surface satisfies Surface,
    start: toStart(given.start),
    ...(given.lineUp === undefined
      ? {}
      : { lineUp: { tora: si('length', given.lineUp.tora), asda: si('length', given.lineUp.asda) } }),
    ...(given.declared === undefined ? {} : { declared: toDeclared(given.declared) }),
  };
}

function toStart(given: RunwayOnWire['start']): Runway['start'] {
  if (given === 'threshold') return { kind: 'threshold' };
  return 'point' in given
    ? { kind: 'point', name: given.point }
    : { kind: 'offset', offset: si('length', given.offset) };
}

function toDeclared({ tora, toda, asda, lda }: NonNullable<RunwayOnWire['declared']>): Declared {
  return {
    ...(tora === undefined ? {} : { tora: si('length', tora) }),
    ...(toda === undefined ? {} : { toda: si('length', toda) }),
    ...(asda === undefined ? {} : { asda: si('length', asda) }),
    ...(lda === undefined ? {} : { lda: si('length', lda) }),
  };
}
