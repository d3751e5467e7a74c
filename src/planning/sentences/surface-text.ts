/** A depth in a sentence, in millimetres whatever the units of the answer: '12 mm'. */
export function depthText(metres: number): string {
  return `${Math.round(metres * 10_000) / 10} mm`;
}

/** A contaminant in a sentence: 'wet snow'. */
export function surfaceText(kind: string): string {
  return kind.replaceAll('-', ' ');
}
