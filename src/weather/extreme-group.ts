import { codedTemperature } from './coded.ts';
import { checkedDayTime } from './day-time.ts';
import type { ForecastExtreme } from './forecast.ts';
import { groupFault, isReportFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';
import { temperatureFault } from './temperature-group.ts';

const form = /^T([XN])(M?)(\d{2})\/(\d{2})(\d{2})Z$/;
const meant = /^T[XN]?M?\d+\/\d+Z?$/;

/** A highest or lowest temperature such as TX25/0114Z or TNM02/0205Z; undefined where the group is not one. */
export function readExtreme(token: Token): ForecastExtreme | ReportFault | undefined {
  const found = form.exec(token.text);
  if (found === null) {
    return meant.test(token.text)
      ? groupFault(
          token,
          'unreadable',
          'cannot be read as a highest or lowest temperature',
          'a group such as TX25/0114Z',
        )
      : undefined;
  }
  const at = checkedDayTime(token, Number(found[4]), Number(found[5]), 0);
  if (isReportFault(at)) return at;
  const [minus, degrees] = [found[2] === 'M', Number(found[3])];
  const fault = temperatureFault(token, minus ? -degrees : degrees);
  if (fault !== undefined) return fault;
  const kind = found[1] === 'X' ? 'highest' : 'lowest';
  return { kind, temperature: codedTemperature(degrees, minus), at };
}
