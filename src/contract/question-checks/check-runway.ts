import { countingDistances } from '../../planning/declared-distances.ts';
import type { Fault } from '../../planning/fault.ts';
import { si } from '../quantity.ts';
import type { RunwayOnWire } from '../runway.ts';
import { startAlong } from '../to-ground-line.ts';
import { written } from '../written.ts';
import { checkDeclared } from './check-declared.ts';
import { checkProfile } from './check-profile.ts';
import { checkSurface } from './check-surface.ts';

/** Members of a runway against each other. */
export function checkRunway(runway: RunwayOnWire, phase: 'takeoff' | 'landing'): Fault[] {
  const start = checkStart(runway, phase);
  return [
    ...checkDeclared(runway.declared ?? {}, '/runway/declared'),
    ...start,
    ...(start.length > 0 ? [] : checkProfile(runway, phase)),
    ...checkSurface(runway.surface),
    ...checkObstacles(runway, phase),
  ];
}

/** What a start offset and lining up take must leave something of each declared distance. */
function checkStart({ start, lineUp, declared = {} }: RunwayOnWire, phase: 'takeoff' | 'landing'): Fault[] {
  const faults: Fault[] = [];
  const offset = typeof start === 'object' && 'offset' in start ? start.offset : undefined;
  const offsetLength = startAlong({ start });
  for (const name of countingDistances[phase]) {
    const length = declared[name];
    if (length === undefined) continue;
    const published = si('length', length);
    if (offset !== undefined && offsetLength > 0 && offsetLength >= published) {
      faults.push({
        pointer: '/runway/start/offset',
        code: 'contradiction',
        message: `A start ${written(offset)} along the runway leaves nothing of ${name.toUpperCase()} ${written(length)}.`,
        received: offset.value,
        allowed: `below ${written(length)}`,
      });
      break;
    }
    if (lineUp === undefined || name === 'lda') continue;
    const member = name === 'asda' ? 'asda' : 'tora';
    const loss = si('length', lineUp[member]);
    if (loss > 0 && offsetLength + loss >= published) {
      faults.push({
        pointer: `/runway/lineUp/${member}`,
        code: 'contradiction',
        message: `Lining up takes ${written(lineUp[member])}, which leaves nothing of ${name.toUpperCase()} ${written(length)}.`,
        received: lineUp[member].value,
      });
      break;
    }
  }
  return faults;
}

/** Obstacles measured from the end of TODA need a TODA; after a landing there is no climb to clear them. */
function checkObstacles({ obstacles, declared }: RunwayOnWire, phase: 'takeoff' | 'landing'): Fault[] {
  if (obstacles === undefined) return [];
  if (phase === 'landing') {
    return [
      {
        pointer: '/runway/obstacles',
        code: 'contradiction',
        message: 'Obstacles are cleared after a takeoff; a landing has no use for them.',
        hint: 'Leave them away in a landing.',
      },
    ];
  }
  if (obstacles.from === 'brake-release' || declared?.toda !== undefined) return [];
  return [
    {
      pointer: '/runway/declared/toda',
      code: 'missing',
      message: 'Obstacles are measured from the end of TODA, and TODA is not given.',
    },
  ];
}
