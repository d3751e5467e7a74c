import { describe, expect, it } from 'vitest';
import { readConfig } from '../../src/http/config.ts';

describe('readConfig', () => {
  it('has a default for all', () => {
    expect(readConfig({})).toEqual({ port: 3000, host: '127.0.0.1', logLevel: 'info' });
  });

  it('reads what is set', () => {
    expect(readConfig({ PORT: '0', HOST: '::', LOG_LEVEL: 'silent', HOME: 'x' })).toEqual({
      port: 0,
      host: '::',
      logLevel: 'silent',
    });
  });

  it.each([
    ['PORT', 'abc'],
    ['PORT', '65536'],
    ['PORT', '-1'],
    ['PORT', '80.5'],
    ['PORT', ''],
    ['PORT', '0x50'],
    ['HOST', ''],
    ['HOST', 'a b'],
    ['LOG_LEVEL', 'loud'],
  ])('refuses %s=%j in one line that names it', (name, value) => {
    expect(() => readConfig({ [name]: value })).toThrow(
      new RegExp(`^${name} is ${JSON.stringify(value)}; it must be .+$`),
    );
  });

  it('names every wrong variable', () => {
    expect(() => readConfig({ PORT: 'x', LOG_LEVEL: 'y' })).toThrow(/PORT .*LOG_LEVEL /);
  });
});
