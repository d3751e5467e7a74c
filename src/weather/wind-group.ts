import { toSi } from '../units/units.ts';
import { type Coded, codedCalm, codedDirection, codedSpeed, type WindUnit, windUnits } from './coded.ts';
import { groupFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

/** Extremes of a varying direction [rad], clockwise from the first to the second, from true north. */
export interface WindSector {
  readonly from: number;
  readonly to: number;
}

/** A wind as reported, its directions from true north. */
export type ReportedWind =
  | {
      readonly kind: 'from';
      readonly from: Coded;
      readonly speed: Coded;
      readonly gust?: Coded;
      readonly sector?: WindSector;
    }
  | { readonly kind: 'variable'; readonly speed: Coded; readonly gust?: Coded; readonly sector?: WindSector }
  | { readonly kind: 'calm'; readonly speed: Coded }
  /** more than the code can say: at least so much [m/s] in the mean or in gusts */
  | { readonly kind: 'beyond-scale'; readonly atLeast: number }
  | { readonly kind: 'not-reported' };

/** The strongest wind that is read [m/s]; more is a slip of a digit or of the unit. @see references.Judgement */
const strongest = 60;

const windForm = /^(\d{3}|VRB|\/{2,3})(P?\d{2,3}|\/\/)(?:G(P?\d{2,3}|\/\/))?(KT|MPS|KMH)$/;
const meantAsWind = /^(?:\d{3}|VRB)\d{2,3}(?:G\d{0,3})?$|^[^W].*(?:KTS?|MPS|KMH|KPH|MPH|M\/S)$|^CALM$|^VRB/;
const sectorForm = /^(\d{3})V(\d{3})$/;

/**
 * The wind of a group such as 27015G25KT; undefined where the group is not one.
 *
 * The unit is mandatory, and calm is 00000 with a unit and nothing else: what cannot be read is a fault, never no wind.
 *
 * @see references.Wmo306, reg. 15.5
 */
export function readWind(token: Token): ReportedWind | ReportFault | undefined {
  const found = windForm.exec(token.text);
  if (found === null) {
    return meantAsWind.test(token.text)
      ? groupFault(
          token,
          'unreadable',
          'cannot be read as a wind',
          'a group such as 27015KT, 27015G25KT, VRB03MPS or 00000KT',
        )
      : undefined;
  }
  const [, direction, mean, gusting, letters] = found as unknown as [string, string, string, string?, WindUnit?];
  const unit = letters as WindUnit;
  const figures: WindFigures = { direction, mean, ...(gusting === undefined ? {} : { gusting }), unit };
  const wrong = wrongFigures(token, figures);
  if (wrong !== undefined) return wrong;
  if (direction.startsWith('/') || mean === '//' || gusting === '//') return { kind: 'not-reported' };
  if (direction === '000') return { kind: 'calm', speed: codedCalm(unit) };
  const exceeded = [mean, gusting].find((one) => one?.startsWith('P'));
  if (exceeded !== undefined) {
    return { kind: 'beyond-scale', atLeast: toSi('speed', speedOf(exceeded) + 1, windUnits[unit]) };
  }
  const speeds = {
    speed: codedSpeed(speedOf(mean), unit),
    ...(gusting === undefined ? {} : { gust: codedSpeed(speedOf(gusting), unit) }),
  };
  return direction === 'VRB'
    ? { kind: 'variable', ...speeds }
    : { kind: 'from', from: codedDirection(Number(direction)), ...speeds };
}

/** The sector of a group such as 240V310; undefined where the group is not one. */
export function readSector(token: Token): WindSector | ReportFault | undefined {
  const found = sectorForm.exec(token.text);
  if (found === null) return undefined;
  const [from, to] = [Number(found[1]), Number(found[2])];
  if (from > 360 || to > 360) {
    return groupFault(token, 'out-of-range', 'has a direction beyond 360 degrees', '000 to 360 on either side of V');
  }
  return { from: toSi('angle', from, 'deg'), to: toSi('angle', to, 'deg') };
}

interface WindFigures {
  readonly direction: string;
  readonly mean: string;
  readonly gusting?: string;
  readonly unit: WindUnit;
}

function wrongFigures(token: Token, { direction, mean, gusting, unit }: WindFigures): ReportFault | undefined {
  if (Number(direction) > 360) {
    return groupFault(
      token,
      'out-of-range',
      `has a direction of ${direction} degrees`,
      '010 to 360, VRB, or 00000 for calm',
    );
  }
  const speeds = [mean, gusting].filter((one) => one !== undefined && one !== '//') as string[];
  if (speeds.some((one) => /^P?0\d\d$/.test(one))) {
    return groupFault(token, 'unreadable', 'has a speed of three figures that begins with 0', 'two figures below 100');
  }
  if (speeds.some((one) => toSi('speed', speedOf(one), windUnits[unit]) > strongest)) {
    const bound = `at most ${strongest} m/s (116 kt, 216 km/h)`;
    return groupFault(token, 'out-of-range', `has a wind above ${strongest} m/s`, bound);
  }
  if (mean === '//' || direction.startsWith('/')) return undefined;
  const still = speedOf(mean) === 0;
  if (still !== (direction === '000')) {
    const says = still ? `has a direction of ${direction} without a speed` : 'has a speed from direction 000';
    return groupFault(token, 'contradiction', says, '360 for a wind from north, 00000 for calm');
  }
  if (gusting === undefined || gusting === '//') return undefined;
  if (still) return groupFault(token, 'contradiction', 'has gusts on a calm', '00000 for calm, without gusts');
  return speedOf(gusting) < speedOf(mean)
    ? groupFault(token, 'contradiction', 'has gusts below the mean', 'gusts at least as strong as the mean')
    : undefined;
}

/** A speed without the P of an exceeded scale. */
function speedOf(figures: string): number {
  return Number(figures.replace('P', ''));
}
