import type {
  ManualAxis,
  ManualNote,
  ManualOutput,
  ManualSheet,
  ProportionalNote,
  WorkedExample,
} from '../../performance/flight-manual/flight-manual.ts';
import { toSi } from '../../units/units.ts';
import { perhaps, present } from '../present.ts';
import { type Q, si } from '../quantity.ts';
import { toSurface } from '../to-runway.ts';
import { columnKinds } from './manual-columns.ts';
import type { ManualNoteOnWire } from './manual-note.ts';
import type { ManualTableOnWire } from './manual-table.ts';
import type { WorkedExampleOnWire } from './worked-example.ts';

/** What tables and graphs share. */
export type SheetOnWire = Pick<
  ManualTableOnWire,
  'id' | 'page' | 'for' | 'configurations' | 'conditions' | 'contains' | 'notes'
>;

/** What tables and graphs share, in SI. */
export function toSheet(given: SheetOnWire): ManualSheet {
  const { id, page, configurations, conditions, contains, notes = [] } = given;
  return {
    id,
    page,
    phase: given.for,
    configurations,
    conditions: present<ManualSheet['conditions']>({
      surface: toSurface(conditions.surface),
      mass: perhaps((mass) => si('mass', mass), conditions.mass),
      technique: conditions.technique,
      screenHeight: perhaps((height) => si('length', height), conditions.screenHeight),
    }),
    contains: { factor: contains?.factor ?? 1, windAllowance: contains?.windAllowance ?? false },
    notes: notes.map(toNote),
  };
}

const measures = {
  headwind: 'speed',
  tailwind: 'speed',
  uphill: 'proportion',
  downhill: 'proportion',
  aboveStandard: 'temperatureDifference',
  belowStandard: 'temperatureDifference',
  aboveMass: 'mass',
  belowMass: 'mass',
} as const;

/** One note in SI. */
export function toNote(given: ManualNoteOnWire): ManualNote {
  if (given.about === 'surface') {
    const { about, multiplies, text } = given;
    const change = given.changePercent / 100;
    return present<ManualNote>({ about, surface: toSurface(given.surface), change, multiplies, text });
  }
  const { about, multiplies, text, per, limit, wholeSteps = false } = given;
  const measure = (step: Q) => toSi(measures[about], step.value, step.unit as never);
  const bands = given.byPressureAltitude?.map(({ upTo, changePercent }) =>
    present<{ upTo?: number; change: number }>({
      upTo: perhaps((altitude) => si('length', altitude), upTo),
      change: changePercent / 100,
    }),
  );
  return present<ProportionalNote>({
    about,
    change: bands ?? (given.changePercent ?? 0) / 100,
    per: measure(per),
    limit: perhaps(measure, limit),
    wholeSteps,
    windAllowance: 'windAllowance' in given && given.windAllowance === true,
    multiplies,
    text,
  });
}

export function toWorkedExample({ given, reads, within }: WorkedExampleOnWire): WorkedExample {
  const { slope, surface, ...axes } = given;
  return present<WorkedExample>({
    given: inSi(axes) as WorkedExample['given'],
    slope: perhaps((rise) => si('proportion', rise), slope),
    surface: perhaps(toSurface, surface),
    reads: inSi(reads) as WorkedExample['reads'],
    within: toleranceOf(within),
  });
}

function inSi(quantities: Readonly<Partial<Record<ManualAxis | ManualOutput, Q>>>): Record<string, number> {
  const entries = Object.entries(quantities) as [ManualAxis | ManualOutput, Q][];
  return Object.fromEntries(
    entries.map(([name, { value, unit }]) => [name, toSi(columnKinds[name].quantity, value, unit as never) + 0]),
  );
}

function toleranceOf({ value, unit }: Q): number {
  if (unit === 'percent') return toSi('proportion', value, unit);
  return unit === 'm' || unit === 'ft' ? toSi('length', value, unit) : toSi('speed', value, unit as never);
}
