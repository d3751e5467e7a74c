import { completed } from '../../src/numerics/work.ts';
import { fitLanding } from '../../src/performance/fit/fit-landing.ts';
import { fitTakeoff } from '../../src/performance/fit/fit-takeoff.ts';
import { madeTables } from '../published/made-tables.ts';
import { landingAsked, takeoffAsked } from '../support/fit-asked.ts';

/** Time of a fit from points to verdict, single thread: the first, as a service meets it, and the least of five. */
export function fitBench(print: (line: string) => void = console.log): void {
  print('fit [ms]                     rows   first   least');
  for (const table of madeTables.tables) {
    const times: number[] = [];
    for (let i = 0; i < 5; i++) {
      const start = performance.now();
      if (table.phase === 'takeoff') completed(fitTakeoff(takeoffAsked(table)));
      else completed(fitLanding(landingAsked(table)));
      times.push(performance.now() - start);
    }
    const [first = 0] = times;
    print(
      `  ${table.id.padEnd(26)} ${String(table.rows.length).padStart(4)} ${first.toFixed(1).padStart(7)} ${Math.min(
        ...times,
      )
        .toFixed(1)
        .padStart(7)}`,
    );
  }
}
