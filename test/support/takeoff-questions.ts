export type Json = { [name: string]: unknown };

const q = (value: number, unit: string) => ({ value, unit });

const definition = {
  id: 'marsh-hen',
  revision: '1',
  name: 'Marsh Hen (invented)',
  category: 'single-piston',
  engines: 1,
  certification: { basis: 'cs-23-amendment-4', screenHeight: q(50, 'ft') },
  masses: { empty: q(610, 'kg'), maximumTakeoff: q(1040, 'kg'), maximumLanding: q(1040, 'kg') },
  wing: { area: q(15.8, 'm2'), span: q(10.7, 'm'), heightAboveGround: q(2.1, 'm') },
  drag: { zeroLiftCoefficient: 0.038, oswaldFactor: 0.73 },
  configurations: {
    'takeoff-10': {
      for: ['takeoff'],
      flap: q(10, 'deg'),
      maximumLift: { coefficient: 1.62 },
      groundLiftCoefficient: 0.38,
      speeds: { liftOff: { stallRatio: 1.15 }, screen: { cas: q(62, 'kt'), mass: q(1040, 'kg') } },
      rotationTime: q(1, 's'),
    },
    clean: {
      for: ['takeoff', 'landing'],
      flap: q(0, 'deg'),
      maximumLift: { stallSpeed: q(52, 'kt'), type: 'cas', mass: q(1040, 'kg') },
    },
  },
  propulsion: { kind: 'fixed-pitch', staticThrust: q(2350, 'N'), propellerDiameter: q(1.9, 'm') },
  limitations: { demonstratedCrosswind: q(15, 'kt') },
};

const runway = {
  designator: '07',
  direction: q(68, 'deg'),
  directionReference: 'true',
  elevation: q(1250, 'ft'),
  slope: q(0.8, 'percent'),
  surface: { kind: 'grass', state: 'wet', grass: 'short', firmness: 'firm' },
  start: 'threshold',
  lineUp: { tora: q(10, 'm'), asda: q(12, 'm') },
  declared: { tora: q(690, 'm'), toda: q(750, 'm'), asda: q(690, 'm') },
};

/** Questions that the contract takes, between them with every choice of form; written here by hand. */
export function sampleQuestions(): Json[] {
  const first = {
    reference: 'morning flight 1',
    asOf: '2026-12-01T10:00:00Z',
    aeroplane: { id: 'marsh-hen' },
    mass: q(1010, 'kg'),
    configuration: 'takeoff-10',
    runway,
    weather: {
      temperature: q(31, 'degC'),
      dewPoint: q(18, 'degC'),
      pressure: { qnh: q(1009, 'hPa') },
      wind: { from: q(250, 'deg'), fromReference: 'true', speed: q(12, 'kt'), gust: q(18, 'kt') },
    },
    ruleSet: 'eu-class-b',
    stage: 'dispatch',
    units: 'm-kt-kg',
    rounding: 'safe',
  };
  const second = {
    aeroplane: { definition },
    mass: q(2200, 'lb'),
    configuration: 'clean',
    runway: {
      ...runway,
      elevation: q(0, 'm'),
      slope: q(-1, 'percent'),
      surface: { kind: 'paved', state: 'dry' },
      start: { offset: q(120, 'm') },
    },
    weather: {
      temperature: q(288.15, 'K'),
      pressure: { stationPressure: q(29.92, 'inHg') },
      wind: { headwind: q(-3, 'm/s'), crosswind: q(2, 'm/s') },
    },
    ruleSet: 'unfactored',
  };
  const third = {
    ...first,
    runway: { ...runway, start: { point: 'B' } },
    weather: { temperature: q(50, 'degF'), pressure: { pressureAltitude: q(2000, 'ft') }, wind: 'calm' },
  };
  return structuredClone([first, second, third]);
}

const wrong: readonly unknown[] = [
  null,
  true,
  0,
  -1,
  1e308,
  Number.POSITIVE_INFINITY,
  '1000',
  '',
  'calm',
  'x'.repeat(70),
  [],
  [1, 2],
  {},
  { value: 5, unit: 'kt' },
  { value: 5, unit: 'kg', note: 1 },
  { id: 'a', definition: {} },
];
const names = ['value', 'unit', 'headwind', 'qnh', 'speed', 'id', 'point', 'kind', '__no', 'elevatio', 'Mass'];

/** A copy with one to three places changed, as a seed says: a value replaced, a member taken, added or renamed. */
export function mutated(question: Json, seed: number): Json {
  let state = seed;
  const next = (below: number): number => {
    state = (Math.imul(state ^ (state >>> 15), 0x2c1b3c6d) + 0x9e3779b9) >>> 0;
    return state % below;
  };
  const copy = structuredClone(question);
  for (let times = next(3) + 1; times > 0; times--) {
    const nodes = objectsIn(copy);
    const node = nodes[next(nodes.length)] as Json;
    const members = Object.keys(node);
    const name = members[next(Math.max(members.length, 1))];
    const kind = next(6);
    if (kind === 0 || name === undefined) node[names[next(names.length)] as string] = wrong[next(wrong.length)];
    else if (kind === 1) delete node[name];
    else if (kind === 2) {
      node[name.slice(0, -1)] = node[name];
      delete node[name];
    } else if (kind === 3 && typeof node[name] === 'number') node[name] = (node[name] as number) * 10 ** (next(9) - 4);
    else node[name] = structuredClone(wrong[next(wrong.length)]);
  }
  return copy;
}

function objectsIn(node: unknown): Json[] {
  if (typeof node !== 'object' || node === null) return [];
  return [...(Array.isArray(node) ? [] : [node as Json]), ...Object.values(node).flatMap(objectsIn)];
}
