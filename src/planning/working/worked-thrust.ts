import type { Propulsion } from '../../performance/aeroplane.ts';
import type { Air } from '../../performance/air.ts';
import { propulsionDefault } from '../../performance/propulsion-defaults.ts';
import type { Thrust } from '../../physics/thrust/thrust.ts';
import type { Worksheet } from './worksheet.ts';

/** What the thrust of a run rests on. */
export interface WorkedThrust {
  /** as defined, at full power */
  readonly propulsion: Propulsion;
  readonly engines: number;
  /** pointer to a member of the aeroplane */
  readonly at: (member: string) => string;
  readonly thrustFactor: number;
  /** 1 at full power */
  readonly fullPowerRatio: number;
  readonly air: Air;
  /** of all engines */
  readonly thrust: Thrust;
}

/** Writes the thrust at one true airspeed, whose symbol and value are given. */
export type ThrustAt = (suffix: string, airspeed: number) => void;

/** The propulsion of a kind. */
export type Of<Kind> = Extract<Propulsion, { kind: Kind }>;

/** The factor of a power setting in a formula; nothing at full power. */
export function setting({ fullPowerRatio }: WorkedThrust, power = ''): string {
  return fullPowerRatio === 1 ? '' : `*f_P${power}`;
}

/** Rated power at the setting that is flown. */
export function setPower(worked: WorkedThrust): string {
  return `P${setting(worked)}`;
}

/** A member of the propulsion as stated, or what is taken for it. */
export function memberLine(
  sheet: Worksheet,
  { propulsion, at }: WorkedThrust,
  symbol: string,
  name: string,
  member: string,
  unit?: 'm' | 'K' | 'W' | 'N',
): number {
  const stated = (propulsion as unknown as Readonly<Record<string, number | undefined>>)[member];
  const value = stated ?? propulsionDefault(propulsion.kind, member);
  sheet.stated({ symbol, name, value, unit, at: at(`/propulsion/${member}`) });
  return value;
}
