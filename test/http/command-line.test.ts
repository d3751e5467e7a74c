import { describe, expect, it } from 'vitest';
import { readCommandLine } from '../../src/http/command-line.ts';

describe('readCommandLine', () => {
  it('starts the service without arguments and verifies with --check', () => {
    expect(readCommandLine([])).toEqual({ check: false });
    expect(readCommandLine(['--check'])).toEqual({ check: true });
  });

  it.each([['check'], ['--Check'], ['--check=1'], ['-c'], ['']])(
    'refuses %j, which must not start the service',
    (given) => {
      expect(() => readCommandLine([given])).toThrow(`${JSON.stringify(given)} is no argument; there is only --check`);
      expect(() => readCommandLine(['--check', given])).toThrow(RangeError);
    },
  );
});
