import { plainRun, quadraticThrust } from './plain-run.ts';

/** The executive jet of Anderson's Introduction to Flight, Ex. 6.17, its drag in ground effect by McCormick's factor 0.76452. */
export const executiveJet = plainRun({
  mass: 88_176.75 / 9.80665,
  wingArea: 29.54,
  groundDragCoefficient: 0.02 + 0.76452 / (Math.PI * 0.81 * 8.939),
  groundLiftCoefficient: 1,
  rollingFriction: 0.02,
  thrust: quadraticThrust(32_485),
  density: 1.225,
  liftOffSpeed: 83.772,
});
