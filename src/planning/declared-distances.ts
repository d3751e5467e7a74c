/** Declared lengths from the start point, and what of them counts [m]. */
export interface DeclaredDistances {
  /** as published from the start point, shortened by a start offset and nothing else */
  readonly published: { readonly tora?: number; readonly toda?: number; readonly asda?: number };
  /** what is compared: line-up loss taken off, clearway capped */
  readonly credited: { readonly tora?: number; readonly toda?: number; readonly asda?: number };
  /** the part of the clearway that does not count [m], where there is one */
  readonly clearwayNotCredited?: number;
}
