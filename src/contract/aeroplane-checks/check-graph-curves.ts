import { between, nodeShare } from '../../performance/flight-manual/node-share.ts';
import type { Fault } from '../../planning/fault.ts';
import type { Heading } from '../flight-manual/manual-columns.ts';
import type { ManualGraphOnWire } from '../flight-manual/manual-graph.ts';
import { checkRange } from './check-range.ts';

type Panel = ManualGraphOnWire['panels'][number];
type Curve = Panel['curves'][number];

/** A guide line passes this near to its own height at the reference, of the greatest height there; our choice. */
const nearReference = 0.01;

/**
 * The curves of one panel: each along its axis, none twice, none across another, no number that its axis cannot have.
 *
 * @param output - on the last panel, what its heights are
 */
export function checkGraphCurves(panel: Panel, output: Heading | undefined, at: string): Fault[] {
  const faults: Fault[] = [];
  const { curves } = panel;
  for (const [i, curve] of curves.entries()) {
    const here = `${at}/curves/${i}`;
    if (curves.findIndex(({ parameter }) => parameter === curve.parameter) < i) {
      const message = `Another curve is drawn for ${curve.parameter} already.`;
      faults.push({ pointer: `${here}/parameter`, code: 'contradiction', message, received: curve.parameter });
    }
    const point = curve.points.findIndex(([x], p) => p > 0 && x <= (curve.points[p - 1]?.[0] as number));
    if (point < 0) {
      faults.push(...checkReference(panel, curve, here));
      continue;
    }
    const [received, previous] = [curve.points[point]?.[0] as number, curve.points[point - 1]?.[0]];
    faults.push({
      pointer: `${here}/points/${point}/0`,
      code: 'contradiction',
      message: `The points of a curve run across: ${received} follows ${previous}.`,
      received,
      allowed: `above ${previous}`,
    });
  }
  return faults.length > 0 ? faults : [...checkCrossing(panel, at), ...checkRanges(panel, output, at)];
}

/** Numbers that an axis, or on the last panel the output, cannot have. */
function checkRanges(panel: Panel, output: Heading | undefined, at: string): Fault[] {
  const parameters = panel.curves.map(({ parameter }, c) => [parameter, `${c}/parameter`] as const);
  const along = (place: 0 | 1) =>
    panel.curves.flatMap(({ points }, c) =>
      points.map((point, p) => [point[place], `${c}/points/${p}/${place}`] as const),
    );
  const check = (heading: Heading | 'previous' | undefined, placed: readonly (readonly [number, string])[]) =>
    heading === undefined || heading === 'previous'
      ? []
      : checkRange(
          heading,
          placed.map(([number]) => number),
          (i) => `${at}/curves/${placed[i]?.[1]}`,
        );
  return [
    ...check(panel.across, along(0)),
    ...check(panel.kind === 'guide' ? 'previous' : panel.parameter, parameters),
    ...check(output, along(1)),
  ];
}

/** A guide line begins at the reference, at its own height. */
function checkReference(panel: Panel, curve: Curve, at: string): Fault[] {
  if (panel.kind !== 'guide') return [];
  const height = heightAt(curve, panel.reference);
  const greatest = Math.max(...panel.curves.map(({ parameter }) => Math.abs(parameter)));
  if (height !== undefined && Math.abs(height - curve.parameter) <= nearReference * greatest) return [];
  return [
    {
      pointer: `${at}/parameter`,
      code: 'contradiction',
      message:
        height === undefined
          ? `The guide line does not reach the reference ${panel.reference}.`
          : `The guide line is at ${height} at the reference.`,
      received: curve.parameter,
      allowed: 'its height at the reference',
    },
  ];
}

/** Two curves of a panel that cross: one of them is of another parameter. */
function checkCrossing({ curves }: Panel, at: string): Fault[] {
  const sorted = curves.map((curve, i) => ({ curve, i })).sort((a, b) => a.curve.parameter - b.curve.parameter);
  for (let k = 1; k < sorted.length; k++) {
    const { curve: low } = sorted[k - 1] as { curve: Curve };
    const { curve: high, i } = sorted[k] as { curve: Curve; i: number };
    const gaps = [...low.points, ...high.points].flatMap(([x]) => {
      const [from, to] = [heightAt(low, x), heightAt(high, x)];
      return from === undefined || to === undefined ? [] : [to - from];
    });
    if (!gaps.some((gap) => gap > 0) || !gaps.some((gap) => gap < 0)) continue;
    return [
      {
        pointer: `${at}/curves/${i}`,
        code: 'contradiction',
        message: `The curves for ${low.parameter} and ${high.parameter} cross.`,
        hint: 'Check the points of both against the graph.',
      },
    ];
  }
  return [];
}

function heightAt({ points }: Curve, x: number): number | undefined {
  const { node, share, beyond } = nodeShare(
    points.map(([along]) => along),
    x,
  );
  if (beyond !== undefined) return undefined;
  const height = (points[node] as readonly [number, number])[1];
  return share === 0 ? height : between(height, (points[node + 1] as readonly [number, number])[1], share);
}
