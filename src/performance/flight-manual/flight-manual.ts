import type { RunwaySurface } from '../../physics/runway-surface.ts';

/**
 * What an operator typed in from a flight manual, in SI: lengths m, masses kg, speeds m/s, temperatures K, temperature
 * differences K, slopes and per cents as ratios, gradients as ratios, flap rad. Rows are as printed.
 */
export interface FlightManual {
  readonly document: string;
  readonly revision: string;
  readonly tables: readonly ManualTable[];
  readonly speedTables: readonly SpeedTable[];
  readonly graphs: readonly ManualGraph[];
}

export const manualPhases = ['takeoff', 'landing', 'climb'] as const;
export type ManualPhase = (typeof manualPhases)[number];

/** What a table or a graph is entered with. */
export const manualAxes = [
  'flap',
  'mass',
  'pressureAltitude',
  'temperature',
  'temperatureDeviation',
  'headwind',
] as const;
export type ManualAxis = (typeof manualAxes)[number];

/** What is read from it; distances in still air or at the headwind of the axis. */
export const manualOutputs = [
  'groundRoll',
  'takeoffDistance',
  'landingDistance',
  'climbGradient',
  'climbRate',
  'liftOff',
  'screen',
  'landingReference',
] as const;
export type ManualOutput = (typeof manualOutputs)[number];

/** What holds for the whole of a table or a graph. */
export interface ManualSheet {
  readonly id: string;
  readonly page: string;
  readonly phase: ManualPhase;
  /** ids of the configurations that it is for */
  readonly configurations: readonly string[];
  readonly conditions: SheetConditions;
  readonly contains: SheetContains;
  /** in the order in which the manual applies them */
  readonly notes: readonly ManualNote[];
}

export interface SheetConditions {
  /** level unless a note speaks of slope */
  readonly surface: RunwaySurface;
  /** where mass is no axis: the one mass that the sheet is for */
  readonly mass?: number;
  /** where flap is no axis and the sheet prints it; it is the configuration's */
  readonly technique?: string;
  /** of the distance to or from the screen; absent: the certification's on takeoff, 50 ft on landing */
  readonly screenHeight?: number;
}

/** What the printed figures hold already. */
export interface SheetContains {
  /** printed distance over the distance flown; 1 for none */
  readonly factor: number;
  /** the headwind axis credits half of a headwind and one and a half of a tailwind */
  readonly windAllowance: boolean;
}

/** A table: one row a node, the axes' values and then the outputs', each column named once. */
export interface ManualTable extends ManualSheet {
  readonly axes: readonly ManualAxis[];
  readonly outputs: readonly ManualOutput[];
  /** [row][axis], as printed: not every combination need be there */
  readonly nodes: readonly (readonly number[])[];
  /** [row][output] */
  readonly cells: readonly (readonly number[])[];
  /** [row] the standard temperature as printed, where the sheet prints one */
  readonly standardTemperatures?: readonly number[];
  readonly workedExamples: readonly WorkedExample[];
}

/** What a note multiplies: both distances, one of them, or the ground roll with the same length added to both. */
export const noteTargets = ['both', 'groundRoll', 'wholeDistance', 'groundRollAddedToBoth', 'climb'] as const;
export type NoteTarget = (typeof noteTargets)[number];

/**
 * One note: a change in proportion to something, or of a kind of surface.
 *
 * Within one note the change is proportional (whole steps only where the manual says 'each full'), several notes multiply,
 * and a share of the ground roll is of the ground roll as corrected so far.
 */
export type ManualNote = ProportionalNote | SurfaceNote;

interface NoteSays {
  readonly multiplies: NoteTarget;
  /** as printed, for the answer's working */
  readonly text?: string;
}

export interface ProportionalNote extends NoteSays {
  readonly about:
    | 'headwind'
    | 'tailwind'
    | 'uphill'
    | 'downhill'
    | 'aboveStandard'
    | 'belowStandard'
    | 'aboveMass'
    | 'belowMass';
  /** change per step: 0.1 is 10 % more; a list by band of pressure altitude, each up to its bound, the last without */
  readonly change: number | readonly { readonly upTo?: number; readonly change: number }[];
  /** one step: m/s, ratio, K or kg */
  readonly per: number;
  /** greatest it reaches; absent: 20 kt of wind, 2 % of slope, 40 K of temperature, nothing of mass */
  readonly limit?: number;
  readonly wholeSteps: boolean;
  /** the note credits half of a headwind, or one and a half of a tailwind, already */
  readonly windAllowance: boolean;
}

export interface SurfaceNote extends NoteSays {
  readonly about: 'surface';
  readonly surface: RunwaySurface;
  readonly change: number;
}

/** Something the manual itself works out, that the sheet must give again. */
export interface WorkedExample {
  /** the headwind too where it is no axis, for the notes */
  readonly given: Readonly<Partial<Record<ManualAxis, number>>>;
  /** slope and surface for the notes */
  readonly slope?: number;
  readonly surface?: RunwaySurface;
  readonly reads: Readonly<Partial<Record<ManualOutput, number>>>;
  /** greatest difference from what the manual reads [m, m/s or ratio] */
  readonly within: number;
}

export const manualSpeedNames = ['rotation', 'liftOff', 'screen', 'landingReference', 'touchdown', 'stall'] as const;
export type ManualSpeed = (typeof manualSpeedNames)[number];

/** Speeds by mass. */
export interface SpeedTable {
  readonly id: string;
  readonly page: string;
  readonly configurations: readonly string[];
  readonly airspeed: 'cas' | 'ias';
  readonly speeds: readonly ManualSpeed[];
  /** rising */
  readonly masses: readonly number[];
  /** [row][speed], calibrated [m/s]: the gate has taken indicated ones through the calibration page */
  readonly cells: readonly (readonly number[])[];
}

/** A chain of panels: what one gives enters the next; guide lines are panels of their own. */
export interface ManualGraph extends ManualSheet {
  readonly panels: readonly GraphPanel[];
  readonly outputs: readonly [ManualOutput];
  /** required: a graph that cannot be verified is not used */
  readonly workedExamples: readonly WorkedExample[];
}

/** A sheet to be read, whichever way it is printed. */
export type Sheet = ManualTable | ManualGraph;

/**
 * One panel of digitised curves.
 *
 * A 'curves' panel is entered with an axis across and read at the parameter's curve, linear between curves. A 'guide' panel
 * carries what the panel before gave along the guide lines from the reference value to the axis value.
 */
export interface GraphPanel {
  readonly kind: 'curves' | 'guide';
  /** what is across: an axis, or with 'previous' what the panel before gave */
  readonly across: ManualAxis | 'previous';
  /** what tells one curve from another; on a guide panel it is the height at the reference value */
  readonly parameter: ManualAxis | 'previous';
  /** where the guide lines begin; on a guide panel only */
  readonly reference?: number;
  /** parameters rising, and along each curve its points */
  readonly curves: readonly { readonly parameter: number; readonly points: readonly (readonly [number, number])[] }[];
}
