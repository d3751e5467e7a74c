import { describe, expect, it } from 'vitest';
import { checkSurface } from '../../../src/contract/question-checks/check-surface.ts';
import type { RunwayOnWire } from '../../../src/contract/runway.ts';

type SurfaceOnWire = RunwayOnWire['surface'];
type Contaminant = NonNullable<SurfaceOnWire['contaminant']>;

const deep = { value: 0.012, unit: 'm' } as const;
const film = { value: 0.003, unit: 'm' } as const;
const on = (state: SurfaceOnWire['state'], kind: Contaminant['kind'], depth?: Contaminant['depth']): SurfaceOnWire => ({
  kind: 'paved',
  state,
  contaminant: depth === undefined ? { kind } : { kind, depth },
});
const faults = (surface: SurfaceOnWire) => checkSurface(surface).map(({ code, pointer }) => `${code} ${pointer}`);

const state = 'contradiction /runway/surface/state';
const noDepth = 'contradiction /runway/surface/contaminant/depth';
const whatDepth = 'missing /runway/surface/contaminant/depth';
const what = 'missing /runway/surface/contaminant';
const unnamed: SurfaceOnWire = { kind: 'paved', state: 'contaminated' };

/** A slip, and beside it what differs in one member and is none. */
const pairs: readonly [title: string, slip: SurfaceOnWire, fault: string, sound: SurfaceOnWire][] = [
  ['contaminated, where it is not wet', unnamed, what, { kind: 'paved', state: 'wet' }],
  ['contaminated by nobody says what', unnamed, what, on('contaminated', 'ice')],
  ['the same, with a code', unnamed, what, { ...unnamed, runwayConditionCode: 3 }],
  [
    'code 6 on what is contaminated',
    { ...unnamed, runwayConditionCode: [6, 6, 6] },
    'contradiction /runway/surface/runwayConditionCode',
    { ...unnamed, runwayConditionCode: [6, 5, 6] },
  ],
  [
    'code 6 on it, not on a dry one',
    { ...unnamed, runwayConditionCode: 6 },
    'contradiction /runway/surface/runwayConditionCode',
    { kind: 'paved', state: 'dry', runwayConditionCode: 6 },
  ],
  [
    'a code beside a braking coefficient',
    { kind: 'paved', state: 'wet', runwayConditionCode: 3, brakingFrictionCoefficient: 0.1 },
    'exactly-one-of /runway/surface/brakingFrictionCoefficient',
    { kind: 'paved', state: 'wet', brakingFrictionCoefficient: 0.1 },
  ],
  ['dry with frost', on('dry', 'frost'), state, on('contaminated', 'frost')],
  ['dry with ice', on('dry', 'ice'), state, { kind: 'paved', state: 'dry' }],
  ['a depth of ice', on('contaminated', 'ice', deep), noDepth, on('contaminated', 'ice')],
  [
    'a depth of compacted snow',
    on('contaminated', 'compacted-snow', deep),
    noDepth,
    on('contaminated', 'dry-snow', deep),
  ],
  ['slush of no depth', on('contaminated', 'slush'), whatDepth, on('contaminated', 'slush', deep)],
  ['a wet runway under deep water', on('wet', 'water', deep), state, on('wet', 'water', film)],
  ['a damp runway under deep water', on('damp', 'water', deep), state, on('flooded', 'water', deep)],
  ['flooded by a film', on('flooded', 'water', film), state, on('contaminated', 'water', film)],
];

describe('the surface of a runway against itself', () => {
  it.each(pairs)('refuses %s', (_, slip, fault, sound) => {
    expect(faults(slip)).toEqual([fault]);
    expect(faults(sound)).toEqual([]);
  });
  it.each(['water', 'slush', 'wet-snow', 'dry-snow'] as const)('wants the depth of %s', (kind) => {
    expect(faults(on('contaminated', kind))).toEqual([whatDepth]);
  });
  it.each(['compacted-snow', 'frost', 'ice', 'wet-ice'] as const)('takes %s without a depth', (kind) => {
    expect(faults(on('contaminated', kind))).toEqual([]);
  });
  it('reads a depth in inches as it does in metres', () => {
    expect(faults(on('wet', 'water', { value: 0.125, unit: 'in' }))).toEqual([state]);
    expect(faults(on('wet', 'water', { value: 0.118, unit: 'in' }))).toEqual([]);
  });
});
