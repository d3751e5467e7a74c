/** Text that is markup already. */
export interface Markup {
  readonly markup: string;
}

type Piece = Markup | string | number | readonly Piece[];

/** Markup with every text put into it escaped: only what another call made goes in as it is. */
export function markup(texts: TemplateStringsArray, ...pieces: readonly Piece[]): Markup {
  return { markup: texts.reduce((before, text, i) => before + written(pieces[i - 1] as Piece) + text) };
}

function written(piece: Piece): string {
  if (typeof piece === 'object') return 'markup' in piece ? piece.markup : piece.map(written).join('');
  return String(piece).replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}
