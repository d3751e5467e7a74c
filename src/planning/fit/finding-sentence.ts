import type { FitColumn, FitFinding } from '../../performance/fit/fit-finding.ts';
import type { ObservationKind } from '../../performance/fit/fit-point.ts';
import { configurationPointer } from '../aeroplane-pointer.ts';
import { measureText, numberText, percentText } from '../sentences/measure-text.ts';
import type { SaidFinding } from './fit-answer.ts';
import type { Origin } from './fit-points.ts';
import type { FitQuestion } from './fit-question.ts';

/** A finding in a sentence of facts, at what it is about. */
export function saidFinding(
  finding: FitFinding,
  question: Pick<FitQuestion, 'aeroplaneAt' | 'configuration' | 'phase' | 'units'>,
  origins: readonly Origin[],
): SaidFinding {
  return { finding, message: sentenceOf(), at: pointer() };

  function sentenceOf(): string {
    const { units, phase } = question;
    const whole = phase === 'takeoff' ? 'takeoff distance' : 'landing distance';
    switch (finding.code) {
      case 'unit-error': {
        const { column, printed, declared, rmsIfSo } = finding;
        return `${capital(columnText(column, whole))}: declared ${declared}, they go with this aeroplane if they are ${printed}. So read, the fit misses by ${percentText(rmsIfSo)} rms.`;
      }
      case 'columns-swapped':
        return `Ground roll and ${whole} stand in each other's column: exchanged, they go with this aeroplane.`;
      case 'outlier': {
        const { row, kind, given, computed, exchanged } = finding;
        const length = (metres: number) => measureText(units, 'distance', metres);
        const digits =
          exchanged === undefined ? '' : ` With two digits exchanged, ${length(exchanged)}, it goes with them.`;
        return `${capital(origins[row]?.name ?? '')}: ${kindText(kind, whole)} ${length(given)} does not go with the rest, which give ${length(computed)}.${digits}`;
      }
      case 'stall-speed-indicated':
        return `${liftText(finding)} An indicated stall speed declared calibrated gives too much: it is 5 kt to 10 kt low.`;
      case 'stall-speed-unit': {
        const { printed, declared } = finding;
        const unit =
          printed === undefined
            ? 'The stall speed is in another unit, or of another mass.'
            : `The speeds are declared ${declared}: if they are ${printed}, the distances go with this aeroplane.`;
        return `${liftText(finding)} ${unit}`;
      }
      case 'maximum-lift-odd':
        return `${liftText(finding)} Give it from a calibrated stall speed at its mass.`;
      case 'node-outside': {
        const { column, row, rows, given, bound } = finding;
        const rest = rows === 1 ? '' : `, and ${rows - 1} more beyond the bound`;
        const value = (si: number) => measureText(units, column, si);
        return `${capital(origins[row]?.name ?? '')}: ${column} ${value(given)}, bound ${value(bound)}${rest}. ${column === 'mass' ? 'The maximum mass of the aeroplane is the bound.' : 'No such tables are made.'}`;
      }
      case 'parameter-at-bound': {
        const { parameter, value } = finding;
        return `${capital(parameterText(parameter))} runs to the bound of its range, ${parameterValueText(parameter, value)}: most often a unit, a column or the speeds are not what they are declared to be, or the table is for another aeroplane, flap or technique.`;
      }
      case 'parameter-implausible': {
        const { parameter, value, range } = finding;
        return `${capital(parameterText(parameter))} comes to ${parameterValueText(parameter, value)}, usual ${range.map((bound) => parameterValueText(parameter, bound)).join(' to ')}: a slip in the table or in the definition is likelier than such an aeroplane.`;
      }
      case 'not-computable':
        return `${capital(origins[finding.row]?.name ?? '')}: with no thrust or braking within the bounds does physics give a distance there.`;
      case 'too-few-points':
        return `There ${finding.distances === 1 ? 'is 1 distance' : `are ${finding.distances} distances`} for ${finding.parameters} parameters: too few for a fit.`;
      case 'no-convergence':
        return 'The search does not settle: the distances do not go with this aeroplane.';
    }
  }

  function pointer(): string {
    switch (finding.code) {
      case 'outlier':
        return origins[finding.row]?.of(finding.kind, 0) ?? '';
      case 'node-outside':
        return origins[finding.row]?.of(finding.column, 0) ?? '';
      case 'not-computable':
        return origins[finding.row]?.at ?? '';
      case 'stall-speed-indicated':
      case 'stall-speed-unit':
      case 'maximum-lift-odd':
        return configurationPointer(question, 'maximumLift');
      case 'unit-error': {
        const { column } = finding;
        const member = column === 'distances' ? 'groundRoll' : column;
        return member === 'maximumLift' || member === 'speeds' ? '' : (origins[0]?.of(member, 0) ?? '');
      }
      default:
        return origins[0]?.at ?? '';
    }
  }
}

/** A parameter in words. */
export function parameterText(name: string): string {
  return (
    {
      thrustFactor: 'the factor on thrust',
      airDragShift: 'the shift of the drag in the air',
      altitudeLapseCoefficient: 'the fall of power with altitude',
      temperatureExponent: 'the fall of power with temperature',
      brakingFrictionCoefficient: 'the braking friction on the whole weight',
      approachAngle: 'the approach angle',
    }[name] ?? name
  );
}

/** Its value to three figures. */
export function parameterValueText(name: string, value: number): string {
  const text = numberText(Number((name === 'approachAngle' ? (value * 180) / Math.PI : value).toPrecision(3)));
  return name === 'approachAngle' ? `${text}°` : text;
}

function liftText({
  coefficient,
  range,
}: {
  readonly coefficient: number;
  readonly range: readonly [number, number];
}): string {
  const [low, high] = range.map((bound) => bound.toFixed(2));
  return `A maximum lift coefficient of ${coefficient.toFixed(2)} follows from the definition; such a configuration has ${low} to ${high}.`;
}

function columnText(column: FitColumn, whole: string): string {
  return {
    groundRoll: 'the ground rolls',
    wholeDistance: `the ${whole}s`,
    distances: `the ground rolls and ${whole}s`,
    mass: 'the masses',
    pressureAltitude: 'the pressure altitudes',
    temperature: 'the temperatures',
    maximumLift: 'the stall speed',
    speeds: 'the speeds',
  }[column];
}

function kindText(kind: ObservationKind, whole: string): string {
  return {
    groundRoll: 'ground roll',
    wholeDistance: whole,
    height: 'distance to a height',
    marker: 'distance to a speed',
  }[kind];
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
