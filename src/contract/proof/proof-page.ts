import type { ManualNoteOnWire } from '../flight-manual/manual-note.ts';
import { written } from '../written.ts';
import { type Markup, markup } from './markup.ts';
import { noData } from './proof-grid.ts';
import type { ProofResponse } from './proof-response.ts';
import { proofStyle } from './proof-style.ts';

/** What every sheet says of itself. */
export const advisoryLine = 'Advisory only; computed, not a page of the flight manual.';

/** A proof as a page to print and to sign, in the order of the answer. */
export function proofPage(proof: ProofResponse): string {
  const { advisory, table, counts } = proof;
  const title = `Proof of table ${table.id}`;
  return markup`<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${title}, advisory</title>
<style>${{ markup: proofStyle }}</style>
</head>
<body>
<p class="notice"><strong>${advisoryLine}</strong> ${advisory.notice}</p>
<h1>${title}</h1>
<p>${advisory.sentence}</p>
<h2>The table</h2>
${terms(tableTerms(proof))}
<h2>Notes, in their order</h2>
${notesOf(table.notes)}
<h2>Cells</h2>
<p>Printed: as typed in. Looked up: what the service reads at the same conditions. Physics: what it computes without the table. Ratio: printed over physics.</p>
${gridOf(proof)}
<p>${counts.differ.length === 0 ? 'No cell differs.' : `Cells that differ: ${counts.differ.length} of ${counts.cells}.`}</p>
<h2>Compared with the flight manual</h2>
${signature(table)}
<h2>Basis</h2>
${terms([
  ['Model version', proof.basis.modelVersion],
  ['Digest of the definition', proof.basis.digests.aeroplane],
  ...proof.basis.sources.map(({ title: source, status }): Term => ['Source', `${source} (${status})`]),
])}
</body>
</html>
`.markup;
}

type Term = readonly [string, string];

function terms(list: readonly Term[]): Markup {
  return markup`<dl>${list.map(([name, text]) => markup`<div><dt>${name}</dt><dd>${text}</dd></div>`)}</dl>`;
}

function tableTerms({ table, question, physics }: ProofResponse): Term[] {
  const { surface, mass, technique, screenHeight } = table.conditions;
  const { contains = {} } = table;
  const { aeroplane, reference, asOf } = question;
  const named = 'definition' in aeroplane ? aeroplane.definition : aeroplane;
  const id = 'id' in named ? named.id : named.basedOn;
  const optional = (name: string, text: string | undefined): Term[] => (text === undefined ? [] : [[name, text]]);
  return [
    ['Aeroplane', `${id}, revision ${named.revision}`],
    ['Document', `${table.document}, revision ${table.revision}, ${table.page}`],
    ['For', `${table.for} in ${table.configurations.join(', ')}`],
    ['Surface', Object.values(surface).map(surfaceWord).join(', ')],
    ...optional('Mass', mass && written(mass)),
    ...optional('Technique', technique),
    ...optional('Screen height', screenHeight && written(screenHeight)),
    ...optional('Figures hold a factor of', contains.factor === undefined ? undefined : String(contains.factor)),
    ...optional(
      'Wind',
      contains.windAllowance === undefined ? undefined : 'the headwind column holds its allowance already',
    ),
    ['Physics', physics.map(({ configuration, method }) => `${method}, ${configuration}`).join('; ') || noData],
    ...optional('Reference', reference),
    ...optional('As of', asOf),
  ];
}

function surfaceWord(word: string | { readonly kind: string }): string {
  return typeof word === 'string' ? word : word.kind;
}

function notesOf(notes: readonly ManualNoteOnWire[] = []): Markup {
  if (notes.length === 0) return markup`<p>None.</p>`;
  return markup`<ol>${notes.map((note) => markup`<li>${noteText(note)}</li>`)}</ol>`;
}

function noteText(note: ManualNoteOnWire): string {
  const text = note.text === undefined ? '' : ` “${note.text}”`;
  if (note.about === 'surface') {
    const surface = Object.values(note.surface).map(surfaceWord).join(', ');
    return `${surface}: ${note.changePercent} % of ${note.multiplies}.${text}`;
  }
  const change =
    note.byPressureAltitude === undefined
      ? `${note.changePercent ?? 0} %`
      : note.byPressureAltitude
          .map((band) => `${band.changePercent} % ${band.upTo === undefined ? 'above' : `up to ${written(band.upTo)}`}`)
          .join(', ');
  const whole = note.wholeSteps === true ? 'each full' : 'each';
  const limit = note.limit === undefined ? 'no limit stated' : `up to ${written(note.limit)}`;
  return `${note.about}: ${change} of ${note.multiplies} for ${whole} ${written(note.per)}, ${limit}.${text}`;
}

const endings = ['Read', 'Agrees', 'Physics', 'Ratio'];
const headings: Readonly<Record<string, string>> = { Read: 'looked up', Physics: 'physics', Ratio: 'ratio' };

/** Agreement is no column on paper: a cell that differs says so in words. */
function gridOf({ columns, rows }: ProofResponse): Markup {
  const shown = columns.flatMap(({ name, unit }, i) => {
    const ending = endings.find((one) => name.endsWith(one));
    if (ending === 'Agrees') return [];
    const agrees = ending === 'Read' ? i + 1 : undefined;
    const isPrinted = columns[i + 1]?.name === `${name}Read`;
    const said = ending === undefined ? (isPrinted ? `${name}, printed` : name) : (headings[ending] as string);
    return [
      {
        i,
        heading: unit === undefined ? said : `${said} [${unit}]`,
        kind: ending ?? (isPrinted ? 'Printed' : 'Entry'),
        agrees,
      },
    ];
  });
  return markup`<table>
<thead><tr>${shown.map(({ heading, kind }) => markup`<th scope="col" class="${kind.toLowerCase()}">${heading}</th>`)}</tr></thead>
<tbody>
${rows.map(
  (row) => markup`<tr>${shown.map(({ i, kind, agrees }) => {
    const differs = agrees !== undefined && row[agrees] === 'no';
    const text = kind === 'Ratio' && typeof row[i] === 'number' ? row[i].toFixed(2) : (row[i] as string | number);
    if (differs) return markup`<td class="differs">${text} differs</td>`;
    return markup`<td class="${kind.toLowerCase()}">${text}</td>`;
  })}</tr>
`,
)}</tbody>
</table>`;
}

function signature({ document, revision, page }: ProofResponse['table']): Markup {
  return markup`<p>I have compared each printed cell and note above with ${page} of ${document}, revision ${revision}.</p>
<table class="signature"><tbody>
${['Document and revision in hand', 'Name', 'Date', 'Signature'].map(
  (line) => markup`<tr><th scope="row">${line}</th><td></td></tr>
`,
)}</tbody></table>`;
}
