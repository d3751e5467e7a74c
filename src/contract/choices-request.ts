import { z } from 'zod';
import { landingRequest } from './landing-request.ts';
import { takeoffRequest } from './takeoff-request.ts';
import { shortText } from './text.ts';

/** The most ways that one question may compare. */
const most = 24;

const takeoffChoice = z
  .strictObject({
    name: shortText.meta({ description: 'How the answer calls this choice; not used otherwise.' }).exactOptional(),
    configuration: takeoffRequest.shape.configuration,
    runway: takeoffRequest.shape.runway,
  })
  .meta({ id: 'TakeoffChoice', description: 'One runway end and start, with a configuration.' });

const landingChoice = z
  .strictObject({
    name: shortText.meta({ description: 'How the answer calls this choice; not used otherwise.' }).exactOptional(),
    configuration: landingRequest.shape.configuration,
    runway: landingRequest.shape.runway,
  })
  .meta({ id: 'LandingChoice', description: 'One runway end and threshold, with a configuration.' });

/** What all choices share; the answer to a choice is short, so that there is nothing to detail or to select from. */
function common<Shape extends TakeoffShape | LandingShape>(shape: Shape): Omit<Shape, OfOne> {
  const { configuration: _, runway: _r, hours: _h, detail: _d, select: _s, ...shared } = shape;
  return shared;
}

type TakeoffShape = typeof takeoffRequest.shape;
type LandingShape = typeof landingRequest.shape;
type OfOne = 'configuration' | 'runway' | 'hours' | 'detail' | 'select';

export const takeoffChoicesRequest = z
  .strictObject({ ...common(takeoffRequest.shape), choices: z.array(takeoffChoice).min(1).max(most) })
  .meta({ id: 'TakeoffChoicesRequest', description: 'One takeoff under one weather and mass, and the ways to do it.' });

export const landingChoicesRequest = z
  .strictObject({ ...common(landingRequest.shape), choices: z.array(landingChoice).min(1).max(most) })
  .meta({ id: 'LandingChoicesRequest', description: 'One landing under one weather and mass, and the ways to do it.' });

export type TakeoffChoicesRequest = z.infer<typeof takeoffChoicesRequest>;
export type LandingChoicesRequest = z.infer<typeof landingChoicesRequest>;
