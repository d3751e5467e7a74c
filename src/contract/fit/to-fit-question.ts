import type { FitColumn } from '../../performance/fit/fit-finding.ts';
import { markerSd, type Observation } from '../../performance/fit/fit-point.ts';
import { aeroplanePointer } from '../../planning/aeroplane-pointer.ts';
import type { Fault, Refused } from '../../planning/fault.ts';
import type { FitQuestion, FitTable, MeasuredRun } from '../../planning/fit/fit-question.ts';
import type { AeroplaneLookup, KnownAeroplane } from '../aeroplane-lookup.ts';
import { presentationOf } from '../assumed-presentation.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { toManualTable } from '../flight-manual/to-manual-table.ts';
import { si } from '../quantity.ts';
import { checkConfigurationId } from '../question-checks/check-configuration-id.ts';
import { aeroplaneAt, toKnownAeroplane } from '../to-known-aeroplane.ts';
import { toSurface } from '../to-runway.ts';
import { checkFitRequest } from './check-fit-request.ts';
import { parameterOf } from './fit-parameter-names.ts';
import type { FitRequest, FitTableOnWire, MeasuredRunOnWire } from './fit-request.ts';

/** A fit as it is asked, with the digest of what it is fitted to. */
export interface AskedFit {
  readonly question: FitQuestion;
  readonly known: KnownAeroplane;
  readonly fittedTo: string;
}

/** A table with the pointer to it. */
interface WireTable {
  readonly table: ManualTableOnWire;
  readonly at: string;
}

/** The gate in of a fit: every fault of meaning at once, or the question in SI. */
export function toFitQuestion(request: FitRequest, lookup: AeroplaneLookup): AskedFit | Refused {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  const faults: Fault[] = checkFitRequest(request);
  if (Array.isArray(known)) return { refused: [...known, ...faults] };
  faults.push(...checkConfigurationId(request.configuration, known.aeroplane, request.for));
  const lapses = 'altitudeLapseCoefficient';
  const { kind } = known.aeroplane.propulsion;
  for (const [i, name] of (request.free ?? []).entries()) {
    const ofPistons = name === lapses || name === 'temperatureExponent';
    if (ofPistons && kind !== 'fixed-pitch' && kind !== 'constant-speed') {
      faults.push({
        pointer: `/free/${i}`,
        code: 'contradiction',
        message: `A propulsion of kind ${kind} has no ${name}.`,
        received: name,
      });
    }
  }
  const tables = faults.length > 0 ? [] : wireTables(request, known);
  if (faults.length === 0 && tables.length === 0 && request.runs === undefined) faults.push(nothingToFit(request));
  if (faults.length > 0) return { refused: faults };

  const { runs = [], stalls = [], free } = request;
  return {
    known,
    fittedTo: lookup.digestOfJson({ tables: tables.map(({ table }) => table), runs, stalls }),
    question: {
      aeroplane: known.aeroplane,
      aeroplaneAt: aeroplaneAt(request.aeroplane),
      configuration: request.configuration,
      phase: request.for,
      tables: tables.map(toFitTable),
      runs: runs.map(toRun),
      stalls: stalls.map(({ cas, mass, uncertaintyPercent }) => ({
        cas: si('speed', cas),
        mass: si('mass', mass),
        relativeSd: uncertaintyPercent / 100,
      })),
      ...(free === undefined ? {} : { free: free.map(parameterOf) }),
      declared: declaredUnits(
        tables.map(({ table }) => table),
        request,
        known,
      ),
      units: presentationOf(request).units,
    },
  };
}

/** The tables of the question, or those of the flight manual where it brings nothing to fit. */
function wireTables(
  { tables, runs, configuration, ...request }: FitRequest,
  { definition }: KnownAeroplane,
): WireTable[] {
  if (tables !== undefined) {
    return tables.map((table, i) => ({
      table: asManualTable(table, i, request.for, configuration),
      at: `/tables/${i}`,
    }));
  }
  if (runs !== undefined) return [];
  const at = aeroplaneAt(request.aeroplane);
  return (definition.flightManual?.tables ?? []).flatMap((table, i) =>
    table.for === request.for &&
    table.configurations.includes(configuration) &&
    table.columns.some(({ name }) => isDistance(name))
      ? [{ table, at: aeroplanePointer(at, `/flightManual/tables/${i}`) }]
      : [],
  );
}

function isDistance(name: string): boolean {
  return name === 'groundRoll' || name === 'takeoffDistance' || name === 'landingDistance';
}

/** A table of the question as one of a manual. */
export function asManualTable(
  { source = '', conditions, contains, columns, rows }: FitTableOnWire,
  i: number,
  phase: FitRequest['for'],
  configuration: string,
): ManualTableOnWire {
  return {
    id: String(i + 1),
    page: source,
    for: phase,
    configurations: [configuration],
    conditions,
    ...(contains === undefined ? {} : { contains }),
    columns,
    rows,
  };
}

function toFitTable({ table, at }: WireTable): FitTable {
  return {
    table: toManualTable(table),
    at: (row, column) => {
      const index = table.columns.findIndex(({ name }) => name === column);
      return index < 0 ? `${at}/rows/${row}` : `${at}/rows/${row}/${index}`;
    },
  };
}

function toRun(given: MeasuredRunOnWire, i: number): MeasuredRun {
  const at = `/runs/${i}`;
  const relativeSd = given.uncertaintyPercent / 100;
  const { groundRoll, takeoffDistance, landingDistance, markers = [], heights = [] } = given;
  const observations: { observation: Observation; at: string }[] = [];
  if (groundRoll !== undefined) {
    observations.push({
      observation: { kind: 'groundRoll', distance: si('length', groundRoll), relativeSd },
      at: `${at}/groundRoll`,
    });
  }
  const whole = takeoffDistance ?? landingDistance;
  if (whole !== undefined) {
    observations.push({
      observation: { kind: 'wholeDistance', distance: si('length', whole), relativeSd },
      at: `${at}/${takeoffDistance === undefined ? 'landingDistance' : 'takeoffDistance'}`,
    });
  }
  heights.forEach(({ distance, height }, k) => {
    observations.push({
      observation: { kind: 'height', height: si('length', height), distance: si('length', distance), relativeSd },
      at: `${at}/heights/${k}`,
    });
  });
  markers.forEach(({ distance, groundSpeed, cas, speedUncertaintyPercent }, k) => {
    const speed = groundSpeed ?? cas;
    if (speed === undefined) return;
    observations.push({
      observation: {
        kind: 'marker',
        speed: si('speed', speed),
        of: groundSpeed === undefined ? 'cas' : 'ground',
        distance: si('length', distance),
        relativeSd: markerSd(speedUncertaintyPercent / 100, relativeSd),
      },
      at: `${at}/markers/${k}`,
    });
  });
  return {
    at,
    mass: si('mass', given.mass),
    pressureAltitude: si('length', given.pressureAltitude),
    temperature: si('temperature', given.temperature),
    headwind: si('speed', given.headwind),
    slope: si('proportion', given.slope),
    surface: toSurface(given.surface),
    observations,
  };
}

/** Units of columns where all tables declare the same, and of the stall speed. */
function declaredUnits(
  tables: readonly ManualTableOnWire[],
  { configuration }: FitRequest,
  { definition }: KnownAeroplane,
): FitQuestion['declared'] {
  const units = (names: readonly string[]): string | undefined => {
    const found = new Set(
      tables.flatMap(({ columns }) => columns.filter(({ name }) => names.includes(name)).map(({ unit }) => unit)),
    );
    return found.size === 1 ? [...found][0] : undefined;
  };
  const lift = definition.configurations[configuration]?.maximumLift;
  const members: readonly (readonly [FitColumn, string | undefined])[] = [
    ['groundRoll', units(['groundRoll'])],
    ['wholeDistance', units(['takeoffDistance', 'landingDistance'])],
    ['distances', units(['groundRoll', 'takeoffDistance', 'landingDistance'])],
    ['mass', units(['mass'])],
    ['pressureAltitude', units(['pressureAltitude'])],
    ['temperature', units(['temperature'])],
    ['speeds', lift !== undefined && 'stallSpeed' in lift ? lift.stallSpeed.unit : undefined],
  ];
  return Object.fromEntries(members.filter(([, unit]) => unit !== undefined)) as FitQuestion['declared'];
}

function nothingToFit({ configuration, ...request }: FitRequest): Fault {
  return {
    pointer: '/tables',
    code: 'missing',
    message: `There is nothing to fit to: no tables, no runs, and the flight manual of the aeroplane has no table of distances of a ${request.for} in ${configuration}.`,
    allowed: 'tables, runs, or a definition with a flightManual',
  };
}
