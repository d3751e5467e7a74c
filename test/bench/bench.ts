/** Prints every speed as a ratio or beside a calibration loop of the same run: `npm run bench`. */
import { fitBench } from './fit-bench.ts';
import { benchHttp } from './http.ts';
import { manualBench } from './manual-bench.ts';
import { physicsBench } from './physics-bench.ts';
import { weatherBench } from './weather-bench.ts';

physicsBench((line) => console.log(line));
manualBench((line) => console.log(line));
fitBench();
weatherBench((line) => console.log(line));
await benchHttp(['plain-cool-sea-level', 'hot-high-wet-grass', 'jet-in-feet']);
