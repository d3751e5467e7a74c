import { z } from 'zod';
import { assumption, digest, modelVersion, sources } from './answer-parts.ts';
import { method } from './distances.ts';
import { manualUse, otherMethod } from './manual-use.ts';

const contributionShape = {
  of: z.string().meta({ description: 'What may be off.' }),
  groundRollPercent: z.number(),
  airDistancePercent: z.number(),
};
const contributionText = 'By how much each distance moves when one input is one standard deviation less favourable.';

export const takeoffContribution = z
  .strictObject({ ...contributionShape, takeoffDistancePercent: z.number() })
  .meta({ id: 'BandContribution', description: contributionText });

export const landingContribution = z
  .strictObject({ ...contributionShape, landingDistancePercent: z.number() })
  .meta({ id: 'LandingBandContribution', description: contributionText });

export type TakeoffContribution = z.infer<typeof takeoffContribution>;
export type LandingContribution = z.infer<typeof landingContribution>;

/** What an answer rests on. */
export function basisOf<Contribution extends z.ZodType>(contribution: Contribution, id: string) {
  return z
    .strictObject({
      method,
      other: otherMethod.exactOptional(),
      flightManual: manualUse.exactOptional(),
      band: z.array(contribution).meta({ description: 'What the 90 % bands are made of.' }).exactOptional(),
      assumed: z.array(assumption),
      notGiven: z.array(z.string()).meta({ description: 'JSON pointers of what could have been given.' }),
      sources,
      modelVersion,
      digests: z.strictObject({ aeroplane: digest, rules: digest }),
    })
    .meta({ id, description: 'What the answer rests on.' });
}

export type BasisOnWire<Contribution> = Omit<z.infer<ReturnType<typeof basisOf>>, 'band'> & {
  readonly band?: Contribution[];
};
