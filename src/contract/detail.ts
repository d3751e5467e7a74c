import { z } from 'zod';
import { details, landingDetails } from '../planning/detail/detail.ts';
import { workingOrigins, workingParts, workingUnits } from '../planning/working/working-line.ts';
import { unitFamilies, unitFor } from '../units/presentation.ts';
import { measure, quantity, source } from './answer-parts.ts';
import { shownSchema } from './shown-quantity.ts';

/** What a question may ask beyond the answer itself, and how that is answered. */
const said =
  'What the answer shall hold beyond what it always holds: working, every quantity in the order of the work, in SI; trajectory, the path at even steps of distance; sensitivities, what each distance changes by with each main input';
export const takeoffDetail = z
  .array(z.enum(details))
  .max(details.length)
  .meta({ description: `${said}; rejected, from where the takeoff still stops and the speeds to expect on the way.` });
export const landingDetail = z
  .array(z.enum(landingDetails))
  .max(landingDetails.length)
  .meta({ description: `${said}.` });

const workingLine = z
  .strictObject({
    part: z.enum(workingParts),
    symbol: z.string().meta({ description: 'As the formulas of later lines write it.' }),
    name: z.string(),
    value: z.number().meta({ description: 'In SI, unrounded.' }),
    unit: z.enum(workingUnits).meta({ description: 'Absent where the number has none.' }).exactOptional(),
    origin: z.enum(workingOrigins).meta({
      description:
        'given by the question or the aeroplane; assumed; a constant; decided by a rule; by the formula; the solution of the equation; from a table or by an integral, which no formula replaces.',
    }),
    formula: z
      .string()
      .meta({
        description:
          'In the symbols of earlier lines, with + - * / ^ and sqrt, ln, exp, sin, cos, asin, min, max, abs.',
      })
      .exactOptional(),
    from: z.array(z.string()).meta({ description: 'The symbols that the formula uses.' }),
    at: z.string().meta({ description: 'JSON pointer to where the question states it, or could.' }).exactOptional(),
    source: source.exactOptional(),
    shown: quantity.meta({ description: 'The same number as the answer writes it.' }).exactOptional(),
  })
  .meta({ id: 'WorkingLine', description: 'One quantity of the working.' });

export const working = z.array(workingLine).meta({
  description: 'Every quantity behind the answer, in the order of the work, so that each can be worked out by hand.',
});

const columnNames = ['distance', 'time', 'groundSpeed', 'trueAirspeed', 'height'] as const;
const columnUnits = ['distance', 'time', 'speed', 'altitude'] as const;
const row = z.tuple([z.number(), z.number(), z.number(), z.number(), z.number()]);

export const trajectory = z
  .strictObject({
    columns: z
      .array(
        z.strictObject({
          name: z.enum(columnNames),
          unit: z.enum([
            ...new Set(unitFamilies.flatMap((family) => columnUnits.map((kind) => unitFor(family, kind)))),
          ]),
        }),
      )
      .meta({ description: 'The columns of the rows, each with its unit.' }),
    rows: z
      .array(row)
      .meta({ description: 'At even steps of distance; distances go up, all else to the nearest step.' }),
  })
  .meta({ id: 'Trajectory', description: 'Where the aeroplane is on the way, as stated, without any factor.' });

const change = shownSchema('DistanceChange', 'distance', 'The change of a distance, longer positive, to a hundredth.');

/** @param wholeDistance - takeoffDistance or landingDistance */
export function sensitivitiesOf<const Whole extends string>(wholeDistance: Whole, id: string) {
  const changes = { groundRoll: change, airDistance: change, [wholeDistance]: change } as Record<
    'groundRoll' | 'airDistance' | Whole,
    typeof change
  >;
  const sensitivity = z
    .strictObject({
      of: z.string().meta({ description: 'Stable name of the input.' }),
      at: z.string().meta({ description: 'JSON pointer to it in the question.' }),
      per: measure.meta({ description: 'For so much more of it.' }),
      change: z
        .strictObject(changes)
        .meta({
          description: 'Absent where there are distances neither with a little more of it nor with a little less.',
        })
        .exactOptional(),
    })
    .meta({ id, description: 'What each distance, as stated, changes by with one input.' });
  return z.array(sensitivity).meta({
    description:
      'By differences of the whole evaluation, central but at a kink: good for small changes, and no substitute for asking again.',
  });
}
