import { codedTemperature } from './coded.ts';
import { checkedDayTime } from './day-time.ts';
import type { ForecastExtreme } from './forecast.ts';
import { groupFault, isReportFault, type ReportFault } from './report-fault.ts';
import type { Token } from './report-text.ts';

const form = /^T([XN])(M?)(\d{2})\/(\d{2})(\d{2})Z$/;
const meant = /^T[XN]?M?\d+\/\d+Z?$/;
const [coldest, warmest] = [-60, 60];

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
  if ((minus && -degrees < coldest) || (!minus && degrees > warmest)) {
    return groupFault(token, 'out-of-range', `has ${minus ? '-' : ''}${degrees} degC`, `${coldest} to ${warmest} degC`);
  }
  const kind = found[1] === 'X' ? 'highest' : 'lowest';
  return { kind, temperature: codedTemperature(degrees, minus), at };
}
