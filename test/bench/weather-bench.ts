import { readForecast } from '../../src/weather/read-forecast.ts';
import { readObservation } from '../../src/weather/read-observation.ts';

const report = 'METAR ZZAA 011250Z 27015G25KT 240V300 9999 -RA FEW020 SCT030CB 18/M02 Q1013 NOSIG';
const forecast =
  'TAF ZZAA 011100Z 0112/0218 27010KT 9999 SCT030 TX12/0114Z TN05/0205Z BECMG 0114/0116 33018G30KT TEMPO 0116/0120 4000 SHRA BKN014';

/** Prints the time to read a report and a forecast: the least mean of ten rounds. */
export function weatherBench(print: (line: string) => void): void {
  print(`METAR read in ${microseconds(() => readObservation(report)).toFixed(1)} µs, at most 50`);
  print(`TAF read in ${microseconds(() => readForecast(forecast)).toFixed(1)} µs`);
}

function microseconds(read: () => unknown): number {
  const calls = 5000;
  let least = Number.POSITIVE_INFINITY;
  for (let round = 0; round < 10; round++) {
    const start = performance.now();
    for (let call = 0; call < calls; call++) read();
    least = Math.min(least, ((performance.now() - start) * 1000) / calls);
  }
  return least;
}
