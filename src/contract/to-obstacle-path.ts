import type { ObstaclePath } from '../planning/answer.ts';
import type { ObstaclePathOnWire } from './obstacle-path.ts';
import { type Presentation, shownQuantity } from './shown-quantity.ts';

/** The path past the obstacles: obstacles up and out, what clears them down. */
export function toObstaclePath(how: Presentation, path: ObstaclePath): ObstaclePathOnWire {
  if (path.outcome === 'does-not-climb') {
    return {
      outcome: path.outcome,
      atHeight: shownQuantity(how, 'altitude', path.atHeight),
      gradient: shownQuantity(how, 'gradient', path.gradient, 'down'),
    };
  }
  if (path.outcome === 'outside-stated-data') {
    return {
      outcome: path.outcome,
      airspeed: shownQuantity(how, 'speed', path.airspeed),
      bound: shownQuantity(how, 'speed', path.bound),
    };
  }
  return {
    outcome: path.outcome,
    begins: shownQuantity(how, 'distance', path.begins, 'up'),
    because: path.because,
    obstacles: path.obstacles.map(({ distance, height, pathHeight, clearance }) => ({
      distance: shownQuantity(how, 'distance', distance, 'down'),
      height: shownQuantity(how, 'altitude', height, 'up'),
      pathHeight: shownQuantity(how, 'altitude', pathHeight, 'down'),
      clearance: shownQuantity(how, 'altitude', clearance, 'down'),
    })),
    critical: path.critical,
  };
}
