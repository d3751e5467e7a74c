import type { Fault } from '../../planning/fault.ts';
import type { ManualGraphOnWire } from '../flight-manual/manual-graph.ts';
import { isAxis, isOutput } from '../flight-manual/to-manual-table.ts';
import { checkGround } from '../question-checks/check-surface.ts';
import { checkGraphCurves } from './check-graph-curves.ts';
import { checkEntries, checkOutputs } from './check-manual-entries.ts';

type Panel = ManualGraphOnWire['panels'][number];

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
      ...checkGraphCurves(panel, i === panels.length - 1 ? output : undefined, `${at}/panels/${i}`),
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
