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

const { configuration: _takeoffConfiguration, runway: _takeoffRunway, ...takeoffCommon } = takeoffRequest.shape;
const { configuration: _landingConfiguration, runway: _landingRunway, ...landingCommon } = landingRequest.shape;

export const takeoffChoicesRequest = z
  .strictObject({ ...takeoffCommon, choices: z.array(takeoffChoice).min(1).max(most) })
  .meta({ id: 'TakeoffChoicesRequest', description: 'One takeoff under one weather and mass, and the ways to do it.' });

export const landingChoicesRequest = z
  .strictObject({ ...landingCommon, choices: z.array(landingChoice).min(1).max(most) })
  .meta({ id: 'LandingChoicesRequest', description: 'One landing under one weather and mass, and the ways to do it.' });

export type TakeoffChoicesRequest = z.infer<typeof takeoffChoicesRequest>;
export type LandingChoicesRequest = z.infer<typeof landingChoicesRequest>;
