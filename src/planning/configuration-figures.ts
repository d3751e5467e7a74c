import type { ScheduledSpeed } from '../performance/aeroplane.ts';
import { configurationPointer } from './aeroplane-pointer.ts';
import type { Assumption } from './answer.ts';
import type { Assumed, NumberMember, NumberOtherEnd } from './assumed.ts';
import type { Question } from './question.ts';
import type { StandingDefault } from './rules/standing-default.ts';
import { numberText } from './sentences/measure-text.ts';

/** One figure that a configuration may leave out. */
export interface Figure<Run> {
  /** name of the member in the configuration */
  readonly member: string;
  /** what it is, for a sentence */
  readonly name: string;
  readonly stated: number | undefined;
  readonly standing: StandingDefault;
  /** where it goes in the run; absent where no distance hangs on it */
  readonly runMember?: NumberMember<Run>;
  /** whether it comes on top of another figure there */
  readonly increment?: boolean;
}

/** One speed of the procedure that a configuration may leave out. */
export interface FigureOfSpeed<Run> {
  readonly member: string;
  readonly name: string;
  readonly stated: ScheduledSpeed | undefined;
  readonly standing: StandingDefault;
  readonly runMember: NumberMember<Run>;
}

/** The figures of a configuration: as stated, or the default, said with where it would be stated and what else it could be. */
export class ConfigurationFigures<Run> {
  readonly assumed: Assumed<NumberOtherEnd<Run>>[] = [];
  readonly #question: Pick<Question, 'aeroplaneAt' | 'configuration'>;

  /** @param question - for the pointers */
  constructor(question: Pick<Question, 'aeroplaneAt' | 'configuration'>) {
    this.#question = question;
  }

  /** Pointer to a member of the configuration. */
  at(member: string): string {
    return configurationPointer(this.#question, member);
  }

  figure({ member, name, stated, standing, runMember, increment = false }: Figure<Run>): number {
    if (stated !== undefined) return stated;
    const { value, otherEnd, kind, because, source } = standing;
    const assumption = { at: this.at(member), value: kind === undefined ? value : { kind, value }, because, source };
    if (runMember === undefined) this.say(name, assumption);
    else {
      this.say(name, assumption, {
        kind: increment ? 'run-increment' : 'run',
        member: runMember,
        value: otherEnd,
        text: textOf(standing),
      });
    }
    return value;
  }

  speed({ member, name, stated, standing, runMember }: FigureOfSpeed<Run>): ScheduledSpeed {
    if (stated !== undefined) return stated;
    const { value, otherEnd, because, source } = standing;
    this.say(
      name,
      { at: this.at(`speeds/${member}`), value, because, source },
      { kind: 'speed', member: runMember, factor: otherEnd / value, text: textOf(standing) },
    );
    return { kind: 'stall-ratio', ratio: value };
  }

  say(name: string, assumption: Assumption, otherEnd?: NumberOtherEnd<Run>): void {
    this.assumed.push(otherEnd === undefined ? { name, assumption } : { name, assumption, otherEnd });
  }
}

function textOf({ otherEnd, kind }: StandingDefault): string {
  if (kind === 'angle') return `${numberText(Math.round((otherEnd * 1800) / Math.PI) / 10)}°`;
  return kind === 'time' ? `${numberText(otherEnd)} s` : numberText(otherEnd);
}
