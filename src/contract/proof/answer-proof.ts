import type { Work } from '../../numerics/work.ts';
import type { Refused } from '../../planning/fault.ts';
import { proofOfTable, type TableProof } from '../../planning/proof/proof-of-table.ts';
import { asChosen } from '../aeroplane-choice.ts';
import type { AeroplaneLookup } from '../aeroplane-lookup.ts';
import type { ManualTableOnWire } from '../flight-manual/manual-table.ts';
import { notice } from '../notice.ts';
import { present } from '../present.ts';
import { type Stamp, toSources } from '../to-basis.ts';
import { toKnownAeroplane } from '../to-known-aeroplane.ts';
import { unknownId } from '../unknown-id.ts';
import { type ProofGrid, proofGrid } from './proof-grid.ts';
import type { ProofRequest } from './proof-request.ts';
import type { ProofResponse } from './proof-response.ts';

/**
 * Each cell of a table back as computed, from gate to gate.
 *
 * @returns work that yields between rows
 */
export function* answerProof(
  request: ProofRequest,
  lookup: AeroplaneLookup,
  stamp: Stamp,
): Work<ProofResponse | Refused> {
  const known = toKnownAeroplane(request.aeroplane, lookup);
  if (Array.isArray(known)) return { refused: known };
  const { definition, aeroplane, digest } = known;
  const { flightManual } = definition;
  const { tables = [] } = flightManual ?? {};
  const index = tables.findIndex(({ id }) => id === request.table);
  const given = tables[index];
  const table = aeroplane.flightManual?.tables[index];
  if (flightManual === undefined || given === undefined || table === undefined) {
    const ids = tables.map(({ id }) => id);
    return { refused: [unknownId('/table', `table of ${aeroplane.id}`, request.table, ids)] };
  }
  const proof = yield* proofOfTable(aeroplane, table);
  const grid = proofGrid(given, proof, aeroplane.airspeedCalibration, `/flightManual/tables/${index}`);
  const { id, page, configurations, conditions, contains, notes } = given;
  const { reference, asOf } = request;
  const cells = proof.rows.length * table.outputs.length;
  return {
    outcome: grid.differ.length === 0 ? 'every-cell-agrees' : 'cells-differ',
    advisory: { notice, sentence: sentenceOf(given, grid, cells, proof), cautions: [] },
    table: present<ProofResponse['table']>({
      id,
      document: flightManual.document,
      revision: flightManual.revision,
      page,
      for: given.for,
      configurations,
      conditions,
      contains,
      notes,
    }),
    physics: proof.physics.map(({ configuration, method }) => ({ configuration, method })),
    columns: grid.columns,
    rows: grid.rows,
    counts: { cells, differ: grid.differ },
    basis: {
      sources: toSources(['HouseManual']),
      modelVersion: stamp.modelVersion,
      digests: { aeroplane: digest },
    },
    question: present<ProofResponse['question']>({
      reference,
      asOf,
      aeroplane: asChosen(request.aeroplane, known),
      table: request.table,
    }),
  };
}

function sentenceOf({ id }: ManualTableOnWire, { differ }: ProofGrid, cells: number, { rows }: TableProof): string {
  const ratios = rows
    .flatMap(({ cells: figures }) =>
      figures.flatMap(({ printed, physics }) => (physics === undefined ? [] : [printed / physics])),
    )
    .sort((a, b) => a - b);
  const read =
    differ.length === 0
      ? `The look-up gives each of the ${cells} figures of ${id} again.`
      : `The look-up does not give ${differ.length} of the ${cells} figures of ${id} again.`;
  const middle = ratios[ratios.length >> 1];
  if (middle === undefined) return read;
  return `${read} Printed over physics is ${(ratios[0] as number).toFixed(2)} to ${(ratios.at(-1) as number).toFixed(2)}, in the middle ${middle.toFixed(2)}.`;
}
