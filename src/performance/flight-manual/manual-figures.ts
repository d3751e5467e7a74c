import type { RunwaySurface } from '../../physics/runway-surface.ts';
import type { ManualAxis, ManualNote, ManualSpeed } from './flight-manual.ts';

/** What the manual is asked, in SI. */
export interface ManualAsked {
  readonly phase: 'takeoff' | 'landing';
  /** id of a configuration */
  readonly configuration: string;
  /** [rad] */
  readonly flap: number;
  readonly mass: number;
  readonly pressureAltitude: number;
  readonly temperature: number;
  /** of the standard atmosphere at that pressure altitude [K] */
  readonly standardTemperature: number;
  /** the wind as given, for what holds an allowance already [m/s] */
  readonly headwind: number;
  /** the wind as the rule set credits it, for everything else; the same as headwind where nothing is credited [m/s] */
  readonly creditedHeadwind: number;
  /** uphill positive in the direction of movement */
  readonly slope: number;
  readonly surface: RunwaySurface;
  /** whether the edge of a sheet stands for what lies beyond it on the side where it is the longer */
  readonly edges: 'use' | 'refuse';
}

/** Where what was asked for lies outside a sheet, and where that ends. */
export interface ManualBound {
  readonly sheet: string;
  /** an axis, what a note is about, or on a graph what the panel before gave, in the measure of the graph's output */
  readonly axis: ManualAxis | ManualNote['about'] | 'previous';
  /** SI */
  readonly given: number;
  readonly bound: number;
  readonly side: 'above' | 'below';
  /** what lies outside is the wind as the rule set counts it; as it is given it lies inside */
  readonly isCredited?: true;
}

/** A note as it was applied. */
export interface AppliedNote {
  readonly sheet: string;
  readonly note: ManualNote;
  /** in the note's own measure, SI; absent for a surface */
  readonly given?: number;
  /** what it makes of what it multiplies: 0.9 is 10 % less */
  readonly factor: number;
}

/** What the manual does not speak of, though the question has it. */
export type ManualSilence = 'wind' | 'slope' | 'surface';

/** A speed that a sheet prints beside its distances. */
export type PrintedSpeed = 'liftOff' | 'screen' | 'landingReference';

/** The manual's own figures, its notes applied in its order [m]. */
export interface ManualFigures {
  readonly outcome: 'figures';
  /** absent where the manual gives the whole distance alone */
  readonly groundRoll: number | undefined;
  /** to or from the screen; absent where it gives the roll alone */
  readonly wholeDistance: number | undefined;
  /** those that the sheet prints beside its distances, CAS [m/s] */
  readonly speeds: Readonly<Partial<Record<PrintedSpeed, number>>>;
  readonly sheets: readonly { readonly id: string; readonly page: string }[];
  readonly notes: readonly AppliedNote[];
  readonly silent: readonly ManualSilence[];
  /** where an edge stands for what lies beyond it */
  readonly edges: readonly ManualBound[];
}

/** The manual's own climb. */
export interface ManualClimb {
  readonly outcome: 'climb';
  /** ratio; absent where the manual gives the rate alone */
  readonly gradient: number | undefined;
  /** [m/s] */
  readonly rate: number | undefined;
  readonly sheets: readonly { readonly id: string; readonly page: string }[];
  readonly notes: readonly AppliedNote[];
  readonly edges: readonly ManualBound[];
}

/** The manual's own speeds of the procedure. */
export interface ManualSpeeds {
  readonly outcome: 'speeds';
  /** CAS [m/s] */
  readonly speeds: Readonly<Partial<Record<ManualSpeed, number>>>;
  readonly sheet: { readonly id: string; readonly page: string };
  /** where the lightest mass stands for a lighter one */
  readonly edges: readonly ManualBound[];
}

/** Outside every sheet for this configuration. */
export interface OutsideManual {
  readonly outcome: 'outside-flight-manual';
  readonly bounds: readonly ManualBound[];
}
