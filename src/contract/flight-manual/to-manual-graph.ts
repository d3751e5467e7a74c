import type {
  GraphPanel,
  ManualAxis,
  ManualGraph,
  ManualOutput,
} from '../../performance/flight-manual/flight-manual.ts';
import { toSi } from '../../units/units.ts';
import { columnKinds, type Heading } from './manual-columns.ts';
import type { ManualGraphOnWire } from './manual-graph.ts';
import { toSheet, toWorkedExample } from './to-manual-sheet.ts';

type PanelOnWire = ManualGraphOnWire['panels'][number];
type Entry = 'previous' | Heading<ManualAxis>;

/**
 * A graph in SI, the curves of each panel in rising order of their parameter.
 *
 * Every height is in the measure of the output: what one panel gives enters the next as it is, whatever the paper's scale.
 */
export function toManualGraph(given: ManualGraphOnWire): ManualGraph {
  const output = given.output as Heading<ManualOutput>;
  return {
    ...toSheet(given),
    outputs: [output.name],
    panels: given.panels.map((panel) => toPanel(panel, output)),
    workedExamples: given.workedExamples.map(toWorkedExample),
  };
}

function toPanel(panel: PanelOnWire, output: Heading): GraphPanel {
  const parameter: Entry = panel.kind === 'guide' ? 'previous' : (panel.parameter as Entry);
  const across = panel.across as Entry;
  const measure = (entry: Entry, value: number) => {
    const { name, unit } = entry === 'previous' ? output : entry;
    return toSi(columnKinds[name].quantity, value, unit as never) + 0;
  };
  const curves = panel.curves
    .map((curve) => ({
      parameter: measure(parameter, curve.parameter),
      points: curve.points.map(([x, y]) => [measure(across, x), measure('previous', y)] as const),
    }))
    .sort((a, b) => a.parameter - b.parameter);
  return {
    kind: panel.kind,
    across: across === 'previous' ? across : across.name,
    parameter: parameter === 'previous' ? parameter : parameter.name,
    ...(panel.kind === 'guide' ? { reference: measure(across, panel.reference) } : {}),
    curves,
  };
}
