import type { fitParameters } from './fit-request.ts';

type ParameterName = (typeof fitParameters)[number];

/** A parameter as performance names it: bare numbers end in what they are only on the wire. */
export function parameterOf(name: ParameterName): string {
  return name === 'airDragShiftCoefficient' ? 'airDragShift' : name;
}

export function parameterName(parameter: string): ParameterName {
  return (parameter === 'airDragShift' ? 'airDragShiftCoefficient' : parameter) as ParameterName;
}
