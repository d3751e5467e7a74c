import { z } from 'zod';
import { type KnownSurface, knownSurfaces } from '../planning/known-surfaces.ts';
import { quantity, source } from './answer-parts.ts';
import { factor } from './assessment.ts';
import type { Draft } from './present.ts';
import { shownQuantity, shownRatio } from './shown-quantity.ts';
import { id } from './text.ts';
import { toFactor } from './to-assessment.ts';

const friction = z
  .strictObject({
    coefficient: z.number().meta({ description: 'Over the load on the wheels; of brakes as they come to rest.' }),
    ofJet: z.number().meta({ description: 'Of free wheels with the tyres of a jet.' }).exactOptional(),
    atFiftyKnots: z.number().meta({ description: 'Of brakes at 50 kt over the ground.' }).exactOptional(),
    displacement: z
      .literal(true)
      .meta({ description: 'The drag of what the wheels push aside comes on top.' })
      .exactOptional(),
    because: z.string(),
    source,
  })
  .meta({ id: 'ListedFriction', description: 'A default where the question gives none.' });

const inRules = z
  .strictObject({
    ruleSet: id,
    phase: z.enum(['takeoff', 'landing']),
    stage: z.enum(['dispatch', 'in-flight']).exactOptional(),
    when: z.string().meta({ description: 'The surface, and for some sets the aeroplane, in the words of the set.' }),
    factors: z.array(factor).meta({ description: 'None: the distance on a paved, dry, level runway itself.' }),
  })
  .meta({ id: 'SurfaceInRules', description: 'What a rule set says of the surface.' });

const listedSurface = z
  .strictObject({
    kind: z.string(),
    state: z.string(),
    grass: z.string().exactOptional(),
    firmness: z.string().exactOptional(),
    contaminant: z.string().exactOptional(),
    contaminantDepth: quantity.meta({ description: 'Of a loose contaminant, as listed.' }).exactOptional(),
    rolling: friction
      .meta({ description: 'Of free wheels; absent: no data, a takeoff is not computed.' })
      .exactOptional(),
    braking: friction
      .meta({
        description:
          'Of braked wheels without anti-skid, with tyres at 100 psi, the poorer of the surface and its condition code; absent: no data, a landing is not computed.',
      })
      .exactOptional(),
    conditionCode: z
      .number()
      .meta({
        description:
          'Runway condition code that a report of it stands for at 15 °C, the poorer where depth or temperature decide.',
      })
      .exactOptional(),
    refused: z.string().meta({ description: 'Why no takeoff and no landing is computed on it.' }).exactOptional(),
    refusedForLight: z.string().meta({ description: 'Why none of a light aeroplane is.' }).exactOptional(),
    ruleSets: z.array(inRules).meta({ description: 'The rule sets that speak of it, each with its factors.' }),
  })
  .meta({ id: 'KnownSurface', description: 'A surface and its state with what is known of it.' });

type Listed = z.infer<typeof listedSurface>;

/** The answer of GET /v1/surfaces. */
export const surfaceList = z.strictObject({ surfaces: z.array(listedSurface) }).meta({
  id: 'SurfaceList',
  description: 'The surfaces a runway may have, with friction and with the factors of the rules that speak of them.',
});

const rounded = { units: 'm-kt-kg', rounding: 'safe' } as const;
const exact = { units: 'm-kt-kg', rounding: 'none' } as const;

/** Every surface with its defaults, as an answer takes them. */
export function toSurfaceList(): z.infer<typeof surfaceList> {
  return { surfaces: knownSurfaces().map(toListed) };
}

function toListed(known: KnownSurface): Listed {
  const { surface, rolling, braking, conditionCode, refused, refusedForLight, inRules: said } = known;
  const { kind, state, grass, firmness, contaminant } = surface;
  const listed = { kind, state } as Draft<Listed>;
  if (grass !== undefined) listed.grass = grass;
  if (firmness !== undefined) listed.firmness = firmness;
  if (contaminant !== undefined) listed.contaminant = contaminant.kind;
  if (contaminant?.depth !== undefined) listed.contaminantDepth = shownQuantity(rounded, 'depth', contaminant.depth);
  if (rolling !== undefined) {
    const { coefficient, ofJet, displacement, because, source: key } = rolling;
    listed.rolling = { coefficient, ofJet, ...(displacement ? { displacement } : {}), because, source: key };
  }
  if (braking !== undefined) {
    listed.braking = {
      coefficient: shownRatio(rounded, braking.atRest),
      atFiftyKnots: shownRatio(rounded, braking.atFiftyKnots),
      because: braking.because,
      source: braking.source,
    };
  }
  if (conditionCode !== undefined) listed.conditionCode = conditionCode;
  if (refused !== undefined) listed.refused = refused;
  if (refusedForLight !== undefined) listed.refusedForLight = refusedForLight;
  listed.ruleSets = said.map(({ factors, ...rest }) => ({
    ...rest,
    factors: factors.map((one) => toFactor(exact, one)),
  }));
  return listed;
}
