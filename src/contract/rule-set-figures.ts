import { categories, certificationBases } from '../performance/aeroplane.ts';
import { contaminantKinds, type Surface, surfaceKinds, surfaceStates } from '../planning/question.ts';
import type { Asked, PhaseRules, RuledAeroplane, RuleSet } from '../planning/rules/rule-set.ts';

const sizes = [
  { masses: { maximumTakeoff: 1000 } },
  { masses: { maximumTakeoff: 5700 }, passengerSeats: 9 },
  { masses: { maximumTakeoff: 5700 }, passengerSeats: 10 },
  { masses: { maximumTakeoff: 5701 }, passengerSeats: 9 },
];
const aeroplanes: readonly RuledAeroplane[] = categories.flatMap((category) =>
  certificationBases.flatMap((basis) =>
    sizes.map((size) => ({
      category,
      engines: category.startsWith('twin') ? 2 : 1,
      certification: { basis, screenHeight: 15 },
      ...size,
    })),
  ),
);

const lengths = [
  { tora: 1000, toda: undefined, asda: undefined },
  { tora: 1000, toda: 1000, asda: 1000 },
  { tora: 1000, toda: 1200, asda: undefined },
  { tora: 1000, toda: undefined, asda: 1200 },
  { tora: 1000, toda: 1200, asda: 1200 },
].map((published) => ({ ...published, lda: 1000 }));

const paved = { kind: 'paved', state: 'dry' } as const;
const surfaces: readonly Surface[] = [
  ...surfaceKinds.flatMap((kind) => surfaceStates.map((state) => ({ kind, state }))),
  ...surfaceKinds.flatMap((kind) =>
    (['dry', 'wet'] as const).map((state) => ({ kind, state, firmness: 'soft' as const })),
  ),
  ...surfaceStates.map((state) => ({ kind: 'grass' as const, state, grass: 'short' as const })),
  ...contaminantKinds.flatMap((kind) =>
    [undefined, 0.002].flatMap((depth) => {
      const contaminant = depth === undefined ? { kind } : { kind, depth };
      return [
        { ...paved, contaminant },
        { kind: 'grass' as const, state: 'wet' as const, contaminant },
      ];
    }),
  ),
];

const [published] = lengths as [Asked['published']];
const plain = { surface: paved, isSlippery: false, conditionCode: undefined, slope: 0, published, reverse: false };

/** Whether more than moisture lies on a surface. */
function isUnder({ state, contaminant }: Surface): boolean {
  return state === 'flooded' || state === 'contaminated' || contaminant !== undefined;
}

/** Everything a surface rule may look at, over one aeroplane of each kind of engine and of each basis it may tell apart. */
const onSurfaces: readonly Asked[] = aeroplanes
  .filter(({ category, masses, certification: { basis } }) => {
    const isAsked = category === 'twin-jet' ? basis === 'cs-25' || basis === 'none' : basis === 'none';
    return masses.maximumTakeoff === 1000 && category.startsWith('twin') && isAsked;
  })
  .flatMap((aeroplane) =>
    (aeroplane.category === 'twin-jet' ? [false, true] : [false]).flatMap((reverse) => [
      ...surfaces.map((surface) => ({ ...plain, aeroplane, surface, reverse, isSlippery: isUnder(surface) })),
      ...([0, 1, 2, 3, 4, 5, 6] as const).map((conditionCode) => ({ ...plain, aeroplane, conditionCode, reverse })),
    ]),
  );
/** Everything a reading may look at, over every aeroplane. */
const inCases: readonly Asked[] = aeroplanes.flatMap((aeroplane) => [
  ...lengths.map((some) => ({ ...plain, aeroplane, published: some })),
  ...(['wet', 'contaminated'] as const).map((state) => ({
    ...plain,
    aeroplane,
    surface: { kind: 'paved' as const, state },
    isSlippery: state === 'contaminated',
  })),
]);

/**
 * Every figure of a rule set in one tree: what is written down, and which of it counts over all surfaces, many aeroplanes and each
 * pattern of declared distances. A changed figure changes the tree, and so the digest that answers carry.
 */
export function ruleSetFigures(ruleSet: RuleSet) {
  const { takeoff, landing, landingInFlight } = ruleSet;
  const phases = [takeoff, landing, ...(landingInFlight === undefined ? [] : [landingInFlight])];
  return {
    // functions are no JSON: they leave the figures
    ruleSet,
    appliesTo: met(ruleSet.appliesTo.map(({ holds }) => holds)),
    phases: phases.map(whatCounts),
  };
}

function whatCounts({ appliesTo = [], surfaces: rules, readings, demands = [] }: PhaseRules) {
  return {
    appliesTo: met(appliesTo.map(({ holds }) => holds)),
    surfaces: onSurfaces.map((asked) => rules.findIndex(({ holds }) => holds(asked))).join(' '),
    readings: inCases.map((asked) => readings.findIndex(({ holds }) => holds(asked))).join(' '),
    demands: met(demands.map(({ appliesTo: holds }) => holds)),
  };
}

/** Of each condition the aeroplanes that meet it, by their places. */
function met(conditions: readonly ((aeroplane: RuledAeroplane) => boolean)[]): readonly string[] {
  return conditions.map((holds) => aeroplanes.map((aeroplane) => (holds(aeroplane) ? '1' : '0')).join(''));
}
