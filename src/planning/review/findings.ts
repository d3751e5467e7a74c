import { aspectRatioUnusual } from './aspect-ratio-unusual.ts';
import { calibrationNotGiven } from './calibration-not-given.ts';
import { cellApart } from './cell-apart.ts';
import { certificationUnusual } from './certification-unusual.ts';
import { columnInOtherUnit } from './column-in-other-unit.ts';
import { columnsSwapped } from './columns-swapped.ts';
import { configurationWithoutTable } from './configuration-without-table.ts';
import { controlSpeedAbove } from './control-speed-above.ts';
import { crosswindNotStated } from './crosswind-not-stated.ts';
import { dragUnusual } from './drag-unusual.ts';
import { emptyMassUnusual } from './empty-mass-unusual.ts';
import type { FindingTest } from './finding-test.ts';
import { fitUnusual } from './fit-unusual.ts';
import { flapWithoutLift } from './flap-without-lift.ts';
import { landingMassUnusual } from './landing-mass-unusual.ts';
import { landingReferenceLow } from './landing-reference-low.ts';
import { maximumLiftUnusual } from './maximum-lift-unusual.ts';
import { noteWithoutLimit } from './note-without-limit.ts';
import { powerUnusual } from './power-unusual.ts';
import { rollShareUnusual } from './roll-share-unusual.ts';
import { rowsNotCompared } from './rows-not-compared.ts';
import { screenHeightUnusual } from './screen-height-unusual.ts';
import { screenSpeedLow } from './screen-speed-low.ts';
import { speedTableDiffers } from './speed-table-differs.ts';
import { speedUnusual } from './speed-unusual.ts';
import { stallSpeedInOtherUnit } from './stall-speed-in-other-unit.ts';
import { tableAndPhysicsDiffer } from './table-and-physics-differ.ts';
import { tableConditionsNotReached } from './table-conditions-not-reached.ts';
import { tableMassAboveMaximum } from './table-mass-above-maximum.ts';
import { tableMassesNotReached } from './table-masses-not-reached.ts';
import { tableTemperatureUnusual } from './table-temperature-unusual.ts';
import { tableWithoutWorkedExample } from './table-without-worked-example.ts';
import { wingLoadingUnusual } from './wing-loading-unusual.ts';

/** Everything a definition can be found to be odd in, in the order in which it is shown: the aeroplane, then its flight manual. */
export const findingTests: readonly FindingTest[] = [
  maximumLiftUnusual,
  stallSpeedInOtherUnit,
  flapWithoutLift,
  emptyMassUnusual,
  landingMassUnusual,
  wingLoadingUnusual,
  powerUnusual,
  dragUnusual,
  aspectRatioUnusual,
  speedUnusual,
  screenSpeedLow,
  landingReferenceLow,
  controlSpeedAbove,
  certificationUnusual,
  screenHeightUnusual,
  calibrationNotGiven,
  crosswindNotStated,
  columnsSwapped,
  columnInOtherUnit,
  tableTemperatureUnusual,
  tableMassAboveMaximum,
  rollShareUnusual,
  cellApart,
  fitUnusual,
  tableAndPhysicsDiffer,
  rowsNotCompared,
  speedTableDiffers,
  configurationWithoutTable,
  tableMassesNotReached,
  tableConditionsNotReached,
  noteWithoutLimit,
  tableWithoutWorkedExample,
];
