import type { Fault } from '../planning/fault.ts';
import type { AerodromeDefinition, RunwayEnd } from './aerodrome-definition.ts';
import { si } from './quantity.ts';
import { checkDeclared, type DeclaredOnWire } from './question-checks/check-declared.ts';
import { checkGroundLine } from './question-checks/check-profile.ts';
import { checkGround } from './question-checks/check-surface.ts';
import { toGroundLine } from './to-ground-line.ts';
import { written } from './written.ts';

const names = ['tora', 'toda', 'asda', 'lda'] as const;
/** Rounding of published lengths in other units [m]. */
const slack = 1e-6;

/** Members of an aerodrome against each other. */
export function checkAerodrome({ ends }: AerodromeDefinition): Fault[] {
  return [
    ...repeated(
      ends.map(({ designator }) => designator),
      (i) => `/ends/${i}/designator`,
    ),
    ...ends.flatMap((end, i) => checkEnd(end, `/ends/${i}`)),
  ];
}

function checkEnd(end: RunwayEnd, at: string): Fault[] {
  const { declared, points = [], surface } = end;
  const faults = [...checkDeclared(declared, `${at}/declared`), ...checkGround(surface, `${at}/surface`)];
  if (names.every((name) => declared[name] === undefined)) {
    faults.push({
      pointer: `${at}/declared`,
      code: 'missing',
      message: 'A runway end without any declared distance is not for use.',
      allowed: `at least one of ${names.join(', ')}`,
      hint: 'Leave the end out.',
    });
  }
  faults.push(...checkObstacles(end, at), ...checkLine(end, at));
  faults.push(
    ...repeated(
      points.map(({ name }) => name),
      (i) => `${at}/points/${i}/name`,
    ),
  );
  points.forEach((point, i) => {
    const pointAt = `${at}/points/${i}/declared`;
    faults.push(...checkDeclared(point.declared, pointAt), ...checkWithin(point.declared, declared, pointAt));
  });
  return faults;
}

/** The end of TODA is the same place from every start point; the brakes are not released in one place. */
function checkObstacles({ obstacles, declared }: RunwayEnd, at: string): Fault[] {
  if (obstacles === undefined) return [];
  if (obstacles.from !== 'end-of-toda') {
    return [
      {
        pointer: `${at}/obstacles/from`,
        code: 'contradiction',
        message: 'Obstacles on file are asked about from every start point and are measured from the end of TODA.',
        received: obstacles.from,
        allowed: 'end-of-toda',
      },
    ];
  }
  if (declared.toda !== undefined) return [];
  return [
    {
      pointer: `${at}/declared/toda`,
      code: 'missing',
      message: 'Obstacles are measured from the end of TODA, and TODA is not given.',
    },
  ];
}

/** A ground line in a file begins where the declared distances do and covers all of them. */
function checkLine({ slope, declared, displacedThreshold }: RunwayEnd, at: string): Fault[] {
  if (!('profile' in slope)) return [];
  const lineAt = `${at}/slope/profile`;
  const faults = checkGroundLine(slope.profile, lineAt);
  if (faults.length > 0) return faults;
  const { distances } = toGroundLine(slope.profile);
  if ((distances[0] as number) > slack) {
    faults.push({
      pointer: `${lineAt}/points/0/0`,
      code: 'contradiction',
      message: 'The profile does not begin where the declared distances do.',
      received: slope.profile.points[0]?.[0] as number,
      allowed: '0',
    });
  }
  const last = slope.profile.points.length - 1;
  const displaced = displacedThreshold === undefined ? 0 : si('length', displacedThreshold);
  for (const name of names) {
    const length = declared[name];
    const begin = name === 'lda' ? displaced : 0;
    if (length === undefined || (distances[last] as number) >= begin + si('length', length) - slack) continue;
    faults.push({
      pointer: `${lineAt}/points/${last}/0`,
      code: 'contradiction',
      message: `The profile ends before ${name.toUpperCase()} ${written(length)} does.`,
      received: slope.profile.points[last]?.[0] as number,
    });
    break;
  }
  return faults;
}

/** What is published from a point is part of what the whole runway has. */
function checkWithin(point: DeclaredOnWire, whole: DeclaredOnWire, at: string): Fault[] {
  return names.flatMap((name): Fault[] => {
    const [length, full] = [point[name], whole[name]];
    if (length === undefined || full === undefined || si('length', length) <= si('length', full) + slack) return [];
    return [
      {
        pointer: `${at}/${name}`,
        code: 'contradiction',
        message: `${name.toUpperCase()} ${written(length)} from a point is more than the whole runway's ${written(full)}.`,
        received: length.value,
        allowed: `at most ${written(full)}`,
      },
    ];
  });
}

function repeated(given: readonly string[], pointer: (index: number) => string): Fault[] {
  return given.flatMap((name, i): Fault[] =>
    given.indexOf(name) === i
      ? []
      : [{ pointer: pointer(i), code: 'contradiction', message: `${name} is there a second time.`, received: name }],
  );
}
