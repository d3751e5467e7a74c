import type { ManualSilence } from '../../performance/flight-manual/manual-figures.ts';

/** What of a question a flight manual does not speak of: of the weather and the runway, of how it is flown, of changes. */
export type Silence = ManualSilence | 'procedure' | 'changes';
