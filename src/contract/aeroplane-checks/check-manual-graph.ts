import { between, nodeShare } from '../../performance/flight-manual/node-share.ts';
import type { Fault } from '../../planning/fault.ts';
import type { ManualGraphOnWire } from '../flight-manual/manual-graph.ts';
import { isAxis, isOutput } from '../flight-manual/to-manual-table.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import { checkEntries, checkOutputs } from './check-manual-entries.ts';

type Panel = ManualGraphOnWire['panels'][number];
type Curve = Panel['curves'][number];

/** A guide line passes this near to its own height at the reference, of the greatest height there; our choice. */
const nearReference = 0.01;

/** One graph: its chain, and each panel's curves. */
export function checkManualGraph(graph: ManualGraphOnWire, at: string): Fault[] {
  const { panels, output, conditions } = graph;
  const entries = panels.flatMap(entriesOf).flatMap((entry) => (entry === 'previous' ? [] : [entry.name]));
  const axes = entries.filter(isAxis);
  return [
    ...checkGround(conditions.surface, `${at}/conditions/surface`),
    ...checkEntries(axes, conditions, `${at}/panels`, `${at}/conditions`),
    ...checkOutputs([output.name].filter(isOutput), graph.for, `${at}/output/name`),
    ...panels.flatMap((panel, i) => [
      ...checkChain(panels, i, `${at}/panels/${i}`),
      ...checkCurves(panel, `${at}/panels/${i}`),
    ]),
  ];
}

export function entriesOf(panel: Panel) {
  return panel.kind === 'guide' ? [panel.across] : [panel.across, panel.parameter];
}

/** What a panel is entered with: axes on the first, what came before on every other, no axis twice. */
function checkChain(panels: readonly Panel[], index: number, at: string): Fault[] {
  const panel = panels[index] as Panel;
  if (panel.kind === 'guide' && index === 0) {
    const message = 'A guide panel carries on what the panel before gave, and there is none before the first.';
    return [{ pointer: `${at}/kind`, code: 'contradiction', message, received: panel.kind, allowed: 'curves' }];
  }
  const entries = entriesOf(panel);
  const before = panels.slice(0, index).flatMap(entriesOf);
  const faults: Fault[] = [];
  for (const [i, entry] of entries.entries()) {
    if (entry === 'previous') continue;
    const isTwice = [...before, ...entries.slice(0, i)].some(
      (other) => other !== 'previous' && other.name === entry.name,
    );
    if (!isTwice) continue;
    const pointer = `${at}/${i === 0 ? 'across' : 'parameter'}/name`;
    faults.push({ pointer, code: 'contradiction', message: `${entry.name} is entered already.`, received: entry.name });
  }
  const carried = entries.filter((entry) => entry === 'previous').length;
  const wanted = panel.kind === 'guide' || index === 0 ? 0 : 1;
  if (carried !== wanted) {
    faults.push({
      pointer: at,
      code: 'contradiction',
      message:
        index === 0 ? 'There is no panel before the first.' : `What the panel before gave enters ${carried} times.`,
      allowed: index === 0 ? 'two axes' : 'previous as exactly one of across or parameter',
    });
  }
  return faults;
}

function checkCurves(panel: Panel, at: string): Fault[] {
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
  return faults.length > 0 ? faults : checkCrossing(panel, at);
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
