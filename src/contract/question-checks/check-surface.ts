import { deepestWet } from '../../physics/runway-surface.ts';
import type { Fault } from '../../planning/fault.ts';
import { si } from '../quantity.ts';
import type { RunwayOnWire } from '../runway.ts';
import { written } from '../written.ts';

type SurfaceOnWire = RunwayOnWire['surface'];

const at = '/runway/surface';

/** Members of a surface against each other. */
export function checkSurface(surface: SurfaceOnWire): Fault[] {
  return [...checkGround(surface, at), ...checkState(surface), ...checkDepth(surface), ...checkCode(surface)];
}

/**
 * What a surface is made of, its members against each other.
 *
 * @param at - pointer to the surface
 */
export function checkGround(
  { kind, grass, firmness }: Pick<SurfaceOnWire, 'kind' | 'grass' | 'firmness'>,
  at: string,
): Fault[] {
  const faults: Fault[] = [];
  if (grass !== undefined && kind !== 'grass') {
    faults.push({
      pointer: `${at}/grass`,
      code: 'contradiction',
      message: `The surface is ${kind}, with ${grass} grass given.`,
      received: grass,
      hint: 'Leave grass away, or make the kind grass.',
    });
  }
  if (firmness !== undefined && kind === 'paved') {
    faults.push({
      pointer: `${at}/firmness`,
      code: 'contradiction',
      message: 'firmness is of the subsoil of an unpaved runway; the surface is paved.',
      received: firmness,
    });
  }
  return faults;
}

/** What the state says lies on the runway against what is named. */
function checkState({ state, contaminant, runwayConditionCode }: SurfaceOnWire): Fault[] {
  if (state === 'contaminated' && contaminant === undefined && runwayConditionCode === undefined) {
    return [
      {
        pointer: `${at}/contaminant`,
        code: 'missing',
        message: 'The runway is contaminated, and neither what with nor a runway condition code is given.',
      },
    ];
  }
  if (state !== 'dry' || contaminant === undefined) return [];
  return [
    {
      pointer: `${at}/state`,
      code: 'contradiction',
      message: `The runway is dry, with ${contaminant.kind} on it.`,
      received: state,
      allowed: contaminant.kind === 'water' ? 'damp, wet, flooded, contaminated' : 'contaminated',
    },
  ];
}

/** A depth belongs to what yields to a wheel, and water is as deep as the state says. */
function checkDepth({ state, contaminant }: SurfaceOnWire): Fault[] {
  if (contaminant === undefined) return [];
  const { kind, depth } = contaminant;
  const yields = kind === 'water' || kind === 'slush' || kind === 'wet-snow' || kind === 'dry-snow';
  if (!yields) {
    if (depth === undefined) return [];
    return [
      {
        pointer: `${at}/contaminant/depth`,
        code: 'contradiction',
        message: `A depth is of water, slush and loose snow; ${kind} has none.`,
        received: depth.value,
        hint: 'Leave depth away, or name what lies on top.',
      },
    ];
  }
  if (depth === undefined) {
    return [
      {
        pointer: `${at}/contaminant/depth`,
        code: 'missing',
        message: `How deep the ${kind} lies is not given; up to 3 mm count as a wet runway, more holds the wheels back.`,
        hint: 'One millimetre is 0.001 m; an eighth of an inch is 0.125 in.',
      },
    ];
  }
  const isDeep = si('length', depth) > deepestWet;
  const isSaidShallow = state === 'damp' || state === 'wet';
  if (isDeep ? !isSaidShallow : state !== 'flooded') return [];
  return [
    {
      pointer: `${at}/state`,
      code: 'contradiction',
      message: `The runway is ${state}, with ${written(depth)} of ${kind} on it: up to 3 mm are wet, more is flooded or contaminated.`,
      received: state,
      allowed: isDeep ? 'flooded, contaminated' : 'damp, wet, contaminated',
    },
  ];
}

/** A code says how the brakes hold, and so does a coefficient; and 6 is of a dry runway. */
function checkCode({ state, contaminant, runwayConditionCode, brakingFrictionCoefficient }: SurfaceOnWire): Fault[] {
  if (runwayConditionCode === undefined) return [];
  const faults: Fault[] = [];
  if (brakingFrictionCoefficient !== undefined) {
    faults.push({
      pointer: `${at}/brakingFrictionCoefficient`,
      code: 'exactly-one-of',
      message: 'A runway condition code and a braking coefficient both say how the brakes hold.',
      received: brakingFrictionCoefficient,
      allowed: 'runwayConditionCode or brakingFrictionCoefficient',
    });
  }
  const codes = typeof runwayConditionCode === 'number' ? [runwayConditionCode] : runwayConditionCode;
  if (state === 'contaminated' && contaminant === undefined && codes.every((code) => code === 6)) {
    faults.push({
      pointer: `${at}/runwayConditionCode`,
      code: 'contradiction',
      message: 'The runway is contaminated, with code 6 of a dry one.',
      received: 6,
      allowed: '0 to 5',
    });
  }
  return faults;
}
