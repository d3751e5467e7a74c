/** What a group tells that is kept as text, since no distance is computed from it. */
export type KeptAs =
  | 'visibility'
  | 'runway-visual-range'
  | 'weather'
  | 'cloud'
  | 'recent-weather'
  | 'wind-shear'
  | 'sea'
  | 'colour-state'
  | 'turbulence-or-icing'
  | 'lowest-setting'
  | 'maintenance';

/** One anchored pattern a kind; the first that holds names the group. @see references.Wmo306, reg. 15.6 to 15.13 */
const forms: readonly (readonly [KeptAs, RegExp])[] = [
  [
    'visibility',
    /^(?:\d{4}(?:NDV|[NSEW]|N[EW]|S[EW])?|CAVOK|\/{4}|[PM]?\d{1,2}SM|[PM]?\d\/\d{1,2}SM|\/{4}SM|\d{1,2}KM)$/,
  ],
  ['runway-visual-range', /^R\d{2}[LCR]?\/(?:\/{4}|[PM]?\d{4}(?:V[PM]?\d{4})?(?:FT)?\/?[UDN]?)$/],
  [
    'weather',
    /^(?:[-+]|VC)?(?:MI|PR|BC|DR|BL|SH|TS|FZ)?(?:DZ|RA|SN|SG|IC|PL|GR|GS|UP|BR|FG|FU|VA|DU|SA|HZ|PY|PO|SQ|FC|SS|DS){1,3}$/,
  ],
  ['weather', /^(?:(?:[-+]|VC)?(?:SH|TS)|NSW|\/\/)$/],
  ['cloud', /^(?:(?:FEW|SCT|BKN|OVC|\/{3})(?:\d{3}|\/{3})(?:CB|TCU|\/{3})?|VV(?:\d{3}|\/{3})|NSC|NCD|SKC|CLR)$/],
  [
    'recent-weather',
    /^RE(?:MI|PR|BC|DR|BL|SH|TS|FZ)?(?:DZ|RA|SN|SG|IC|PL|GR|GS|UP|FG|VA|SA|DU|PO|SQ|FC|SS|DS|\/\/){0,3}$/,
  ],
  ['sea', /^W(?:M?\d{2}|\/\/)\/(?:S[\d/]|H\d{1,3})$/],
  ['colour-state', /^(?:BLACK)?(?:BLU|WHT|GRN|YLO[12]?|AMB|RED)\+?$/],
  ['wind-shear', /^WS\d{3}\/\d{5,6}KT$/],
  ['turbulence-or-icing', /^[56]\d{5}$/],
  ['lowest-setting', /^QNH\d{4}INS$/],
  ['maintenance', /^\$$/],
];
const miles = /^\d$/;
const partOfMile = /^\d\/\d{1,2}SM$/;
const shearRunway = /^(?:R(?:WY)?\d{2}[LCR]?|RWY|ALL)$/;

/**
 * What a group is that is kept as text; undefined where it is none of these.
 *
 * @param next - the group after it: a whole number of miles is told by the part of a mile that follows
 */
export function keptAs(text: string, next: string | undefined): KeptAs | undefined {
  if (miles.test(text) && next !== undefined && partOfMile.test(next)) return 'visibility';
  return forms.find(([, form]) => form.test(text))?.[0];
}

/** How many groups from here on tell of wind shear along runways: WS R27, WS ALL RWY, WS LDG RWY27. */
export function windShearLength(first: string, second: string | undefined, third: string | undefined): number {
  if (first !== 'WS' || second === undefined) return 0;
  if (second === 'ALL' || second === 'LDG' || second === 'TKOF') {
    return third !== undefined && shearRunway.test(third) ? 3 : 0;
  }
  return shearRunway.test(second) ? 2 : 0;
}
