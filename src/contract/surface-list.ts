import { z } from 'zod';
import { brakingFriction } from '../physics/braking-friction.ts';
import { rollingFriction } from '../physics/friction.ts';
import { runwayConditionCode } from '../physics/runway-condition-code.ts';
import type { RunwaySurface } from '../physics/runway-surface.ts';
import { source } from './answer-parts.ts';
import type { Draft } from './present.ts';

const friction = z
  .strictObject({
    coefficient: z.number().meta({ description: 'Over the load on the wheels; of brakes as they come to rest.' }),
    because: z.string(),
    source,
  })
  .meta({ id: 'ListedFriction', description: 'A default where the question gives none.' });

const listedSurface = z
  .strictObject({
    kind: z.string(),
    state: z.string(),
    grass: z.string().exactOptional(),
    firmness: z.string().exactOptional(),
    contaminant: z.string().exactOptional(),
    rolling: friction
      .meta({ description: 'Of free wheels, propeller aeroplanes; absent: no data, a takeoff is not computed.' })
      .exactOptional(),
    braking: friction
      .meta({
        description:
          'Of braked wheels without anti-skid, on wet pavement with tyres at 100 psi; absent: no data, a landing is not computed.',
      })
      .exactOptional(),
    conditionCode: z
      .number()
      .meta({
        description:
          'Runway condition code that a report of it stands for, the poorer where depth or temperature decide.',
      })
      .exactOptional(),
  })
  .meta({ id: 'KnownSurface', description: 'A surface and its state with what is known of it.' });

/** The answer of GET /v1/surfaces. */
export const surfaceList = z.strictObject({ surfaces: z.array(listedSurface) }).meta({
  id: 'SurfaceList',
  description: 'The surfaces a runway may have, with friction; the factors of the rules stand in GET /v1/rule-sets.',
});

const bare: readonly RunwaySurface[] = [
  ...(['dry', 'damp', 'wet', 'flooded'] as const).flatMap((state): RunwaySurface[] => [
    { kind: 'paved', state },
    { kind: 'grass', state, grass: 'short', firmness: 'firm' },
    { kind: 'grass', state, grass: 'long', firmness: 'firm' },
    { kind: 'grass', state, firmness: 'soft' },
    { kind: 'gravel', state },
    { kind: 'dirt', state },
  ]),
  { kind: 'snow', state: 'dry' },
  { kind: 'ice', state: 'dry' },
];
const covered = ['water', 'slush', 'wet-snow', 'dry-snow', 'compacted-snow', 'frost', 'ice', 'wet-ice'] as const;

/** Tyre pressure of the listed wet braking [Pa]: 100 psi, the middle of the published curves. */
const listedTyrePressure = 689_475.7293168361;

/** Every surface with its defaults, as the physics has them. */
export function toSurfaceList(): z.infer<typeof surfaceList> {
  const contaminated = covered.map((kind): RunwaySurface => {
    return { kind: 'paved', state: 'contaminated', contaminant: { kind } };
  });
  return { surfaces: [...bare, ...contaminated].map(toListed) };
}

function toListed(surface: RunwaySurface): z.infer<typeof listedSurface> {
  const { kind, state, grass, firmness, contaminant } = surface;
  const listed: Draft<z.infer<typeof listedSurface>> = { kind, state };
  if (grass !== undefined) listed.grass = grass;
  if (firmness !== undefined) listed.firmness = firmness;
  if (contaminant !== undefined) listed.contaminant = contaminant.kind;
  const rolling = rollingFriction(surface, false);
  if (rolling !== 'no-data') listed.rolling = toFriction(rolling.coefficient, rolling);
  const braking = brakingFriction(surface, 'none', listedTyrePressure);
  if (braking !== 'no-data') listed.braking = toFriction(braking.at(0), braking);
  const code = runwayConditionCode(surface);
  if (code !== 'no-data') listed.conditionCode = code.code;
  return listed;
}

function toFriction(
  coefficient: number,
  { because, source: key }: { because: string; source: z.infer<typeof source> },
) {
  return { coefficient: Math.round(coefficient * 1e4) / 1e4, because, source: key };
}
