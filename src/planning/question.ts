import type { Aeroplane } from '../performance/aeroplane.ts';
import type { SlopeProfile } from '../performance/slope-profile.ts';
import type { UnitFamily } from '../units/presentation.ts';

/**
 * What every question of a field length holds, in SI, as the contract's gate hands it in. Angles in rad, clockwise from north
 * where they are directions.
 */
export interface Question {
  readonly aeroplane: Aeroplane;
  /** SHA-256 of the definition, hex */
  readonly aeroplaneDigest: string;
  /** pointer to the aeroplane in the request: '/aeroplane' by id, '/aeroplane/definition' inline, '/aeroplane/changes' */
  readonly aeroplaneAt: string;
  /** where the aeroplane is one on file with changes */
  readonly changes?: AeroplaneChanges;
  readonly mass: number;
  /** id of a configuration; may not exist in the aeroplane: planning refuses it with the list */
  readonly configuration: string;
  readonly runway: Runway;
  readonly weather: Weather;
  /** where the weather was read from a report */
  readonly report?: ReportRead;
  /** id of a rule set; with operator's rules the one they are based on */
  readonly ruleSet: string;
  readonly operatorRules?: OperatorRules;
  readonly stage?: 'dispatch' | 'in-flight';
  /** where the distances come from; absent: the best there is, the flight manual first */
  readonly method?: MethodAsked;
  /** whether the edge of a manual's sheet stands for what lies beyond it on its longer side; absent: it does, and is named */
  readonly edges?: 'use' | 'refuse';
  /** presentation only: the family in which sentences are written */
  readonly units: UnitFamily;
  /** pointers of members that the gate filled in (units, rounding ...): said under basis.assumed */
  readonly defaulted: readonly string[];
}

/** Where distances may be asked to come from. */
export const methodsAsked = ['best', 'flight-manual', 'fitted', 'stated'] as const;
export type MethodAsked = (typeof methodsAsked)[number];

/** Factors of an operator's own, each stricter than those of the rule set they stand in for. */
export interface OperatorRules {
  readonly name: string;
  readonly factors: readonly OperatorFactor[];
}

export type OperatorFactor =
  | {
      /** code of a check */
      readonly check: string;
      readonly overallFactor: number;
    }
  | {
      readonly phase: 'takeoff' | 'landing';
      /** of firm ground without contaminant */
      readonly kind: Surface['kind'];
      readonly state: Surface['state'];
      readonly surfaceFactor: number;
    };

/** What was changed of an aeroplane on file, in words. */
export interface AeroplaneChanges {
  readonly basedOn: string;
  /** of the aeroplane on file */
  readonly revision: string;
  readonly because: string;
  /** one text a change: 'wing/area 13.4 m2 in place of 12.9 m2' */
  readonly changed: readonly string[];
  /** the aeroplane on file, where what is changed moves its distances; absent: names and limits alone are changed */
  readonly flewAs?: Aeroplane;
}

/** How a takeoff is flown; a member that is absent takes the configuration's own figure, and full power. */
export interface TakeoffProcedure {
  /** id of a power setting of the propulsion */
  readonly power?: string;
  readonly start?: 'standing' | 'rolling';
}

export interface TakeoffQuestion extends Question {
  readonly procedure?: TakeoffProcedure;
  /** V1, CAS [m/s]; absent: chosen */
  readonly decisionSpeed?: number;
}

/** How a landing is flown; a member that is absent takes the configuration's own figure, and no reverse thrust. */
export interface LandingProcedure {
  /** on top of the landing reference speed, CAS [m/s] */
  readonly approachSpeedIncrement?: number;
  readonly approachAngle?: number;
  readonly reverse?: boolean;
  readonly antiSkid?: 'operative' | 'inoperative';
  /** touchdown to brakes [s] */
  readonly reactionTime?: number;
}

export interface LandingQuestion extends Question {
  readonly procedure?: LandingProcedure;
}

export const surfaceKinds = ['paved', 'grass', 'gravel', 'dirt', 'snow', 'ice'] as const;
export const surfaceStates = ['dry', 'damp', 'wet', 'flooded', 'contaminated'] as const;
export const contaminantKinds = [
  'water',
  'slush',
  'wet-snow',
  'dry-snow',
  'compacted-snow',
  'frost',
  'ice',
  'wet-ice',
] as const;

export interface Surface {
  readonly kind: (typeof surfaceKinds)[number];
  readonly state: (typeof surfaceStates)[number];
  readonly grass?: 'short' | 'long';
  readonly firmness?: 'firm' | 'soft';
  readonly contaminant?: { readonly kind: (typeof contaminantKinds)[number]; readonly depth?: number };
  readonly runwayConditionCode?: number | readonly [number, number, number];
  readonly rollingFrictionCoefficient?: number;
  readonly brakingFrictionCoefficient?: number;
}

/** Obstacles straight ahead, from brake release or from the end of TODA. */
export interface Obstacles {
  readonly from: 'brake-release' | 'end-of-toda';
  /** distance from there and height above the runway there [m], at least one */
  readonly list: readonly { readonly distance: number; readonly height: number }[];
}

export interface Declared {
  readonly tora?: number;
  readonly toda?: number;
  readonly asda?: number;
  readonly lda?: number;
}

export interface Runway {
  readonly designator: string;
  readonly direction: number;
  readonly directionReference: 'true' | 'magnetic';
  /** east positive */
  readonly magneticVariation?: number;
  readonly elevation: number;
  /** uphill positive in the direction of movement; with a profile, of the line that planning takes for the whole */
  readonly slope: number;
  /** the ground line from the start point on */
  readonly profile?: SlopeProfile;
  readonly surface: Surface;
  readonly start:
    | { readonly kind: 'threshold' }
    | { readonly kind: 'offset'; readonly offset: number }
    | { readonly kind: 'point'; readonly name: string };
  readonly lineUp?: { readonly tora: number; readonly asda: number };
  readonly declared?: Declared;
  readonly obstacles?: Obstacles;
  readonly onFile?: RunwayOnFile;
}

/** Where a runway came from, where it is one on file. */
export interface RunwayOnFile {
  readonly aerodrome: string;
  readonly revision: string;
  /** what the question put in place of what is on file, in words */
  readonly changed: readonly string[];
  /** with a named point: what is declared for the whole runway [m] */
  readonly full?: Declared;
}

/** What was read of a report of the weather. */
export interface ReportRead {
  readonly station: string;
  /** [s], below 0 where it is of a later time than the question; absent where the question has no time */
  readonly age?: number;
  /** what the question put in place of what the report says, in words */
  readonly replaced: readonly string[];
  /** groups from which nothing was taken */
  readonly notUnderstood: readonly string[];
  /** of the runways, as the report has it */
  readonly runwayState?: string;
  /** how far the true wind may lie from what is written, to either side [rad], [m/s]; what temperature and pressure round is in their own uncertainties */
  readonly rounding: { readonly direction?: number; readonly speed?: number };
}

export interface Weather {
  readonly temperature: number;
  readonly dewPoint?: number;
  readonly pressure: { readonly kind: 'qnh' | 'pressureAltitude' | 'stationPressure'; readonly value: number };
  readonly wind: Wind;
}

export type Wind =
  | {
      readonly kind: 'from';
      readonly from: number;
      readonly fromReference: 'true' | 'magnetic';
      readonly speed: number;
      readonly gust?: number;
      readonly variable?: { readonly from: number; readonly to: number };
    }
  /** from any direction, as a report's VRB */
  | { readonly kind: 'variable'; readonly speed: number; readonly gust?: number }
  | { readonly kind: 'components'; readonly headwind: number; readonly crosswind?: number }
  | { readonly kind: 'calm' };
