import { countingDistances } from '../../planning/declared-distances.ts';
import type { Fault } from '../../planning/fault.ts';
import { si } from '../quantity.ts';
import type { RunwayOnWire } from '../runway.ts';
import type { ProfileOnWire } from '../slope.ts';
import { startAlong, toGroundLine } from '../to-ground-line.ts';
import { figure, written } from '../written.ts';

/** Steeper than any runway: a slip of unit or digit. The bound of a slope given as one number. */
const steepest = 0.1;
/** Rounding of a survey's own figures [m]. */
const slack = 1e-6;

/** A ground line against itself, and against the start point and the declared distances that it must cover. */
export function checkProfile(runway: RunwayOnWire, phase: 'takeoff' | 'landing'): Fault[] {
  const { slope } = runway;
  if (!('profile' in slope)) return [];
  const faults = checkGroundLine(slope.profile, '/runway/slope/profile');
  return faults.length > 0 ? faults : checkCover(runway, slope.profile, phase);
}

/** Members of a ground line against each other. */
export function checkGroundLine(profile: ProfileOnWire, at: string): Fault[] {
  const { distances, heights } = toGroundLine(profile);
  const [along, up] = profile.units;
  const faults: Fault[] = [];
  for (let i = 1; i < distances.length; i++) {
    const length = (distances[i] as number) - (distances[i - 1] as number);
    const [to, height] = profile.points[i] as readonly [number, number];
    const [from, before] = profile.points[i - 1] as readonly [number, number];
    if (!(length > 0)) {
      faults.push({
        pointer: `${at}/points/${i}/0`,
        code: 'contradiction',
        message: `The point at ${to} ${along} does not come after the one at ${from} ${along}.`,
        received: to,
        allowed: `above ${from}`,
        hint: 'Points stand in the direction of movement.',
      });
      continue;
    }
    const slope = ((heights[i] as number) - (heights[i - 1] as number)) / length;
    if (Math.abs(slope) <= steepest * (1 + 1e-9)) continue;
    faults.push({
      pointer: `${at}/points/${i}/1`,
      code: 'implausible',
      message: `From ${before} ${up} at ${from} ${along} to ${height} ${up} at ${to} ${along} the ground slopes ${figure(100 * slope)} %.`,
      received: height,
      allowed: '-10 to 10 %',
      hint: 'Check the unit of each column.',
    });
  }
  return faults;
}

/** From the start point to the end of the longest declared distance that counts: beyond its points a line says nothing. */
function checkCover(runway: RunwayOnWire, profile: ProfileOnWire, phase: 'takeoff' | 'landing'): Fault[] {
  const { distances } = toGroundLine(profile);
  const [along] = profile.units;
  const start = startAlong(runway);
  const first = distances[0] as number;
  const last = distances[distances.length - 1] as number;
  const faults: Fault[] = [];
  if (first > start + slack) {
    faults.push({
      pointer: '/runway/slope/profile/points/0/0',
      code: 'contradiction',
      message: `The profile begins ${profile.points[0]?.[0]} ${along} along the runway, after the start point.`,
      received: profile.points[0]?.[0] as number,
      allowed: 'a first point at or before the start point',
    });
  }
  const { name, length } = longestDeclared(runway, phase);
  if (length === undefined || name === undefined) {
    faults.push({
      pointer: '/runway/declared',
      code: 'missing',
      message: 'Without declared distances nobody can see whether the profile covers the runway.',
      allowed: `at least one of ${countingDistances[phase].join(', ')}`,
    });
  } else if (last < si('length', length) - slack) {
    const end = profile.points.length - 1;
    faults.push({
      pointer: `/runway/slope/profile/points/${end}/0`,
      code: 'contradiction',
      message: `The profile ends ${profile.points[end]?.[0]} ${along} along the runway, before the end of ${name.toUpperCase()} ${written(length)}.`,
      received: profile.points[end]?.[0] as number,
      allowed: `at least ${written(length)}`,
      hint: 'Add a point at the end; a line is not drawn on beyond its points.',
    });
  }
  return faults;
}

function longestDeclared({ declared = {} }: RunwayOnWire, phase: 'takeoff' | 'landing') {
  const given = countingDistances[phase].flatMap((name) => {
    const length = declared[name];
    return length === undefined ? [] : [{ name, length }];
  });
  const [longest] = given.sort((a, b) => si('length', b.length) - si('length', a.length));
  return longest ?? { name: undefined, length: undefined };
}
