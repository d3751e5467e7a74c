import { physicsBench } from './physics-bench.ts';

physicsBench((line) => console.log(line));
