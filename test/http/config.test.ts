import { describe, expect, it } from 'vitest';
import { readConfig } from '../../src/http/config.ts';

describe('readConfig', () => {
  it('has a default for all', () => {
    expect(readConfig({})).toEqual({
      port: 3000,
      host: '127.0.0.1',
      logLevel: 'info',
      catalogue: { builtIn: true },
    });
  });

  it('reads what is set', () => {
    expect(readConfig({ PORT: '0', HOST: '::', LOG_LEVEL: 'silent', HOME: 'x' })).toMatchObject({
      port: 0,
      host: '::',
      logLevel: 'silent',
    });
    const { catalogue } = readConfig({ CATALOGUE: '/srv/aeroplanes', CATALOGUE_BUILT_IN: 'off' });
    expect(catalogue).toEqual({ builtIn: false, folder: '/srv/aeroplanes' });
    expect(readConfig({ CATALOGUE: 'own' }).catalogue).toEqual({ builtIn: true, folder: 'own' });
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
    ['CATALOGUE', ''],
    ['CATALOGUE_BUILT_IN', ''],
    ['CATALOGUE_BUILT_IN', 'OFF'],
    ['CATALOGUE_BUILT_IN', 'false'],
  ])('refuses %s=%j in one line that names it', (name, value) => {
    expect(() => readConfig({ [name]: value })).toThrow(
      new RegExp(`^${name} is ${JSON.stringify(value)}; it must be .+$`),
    );
  });

  it('names every wrong variable', () => {
    expect(() => readConfig({ PORT: 'x', LOG_LEVEL: 'y' })).toThrow(/PORT .*LOG_LEVEL /);
  });

  it.each([
    ['CATALOGUE_BUILTIN', 'CATALOGUE_BUILT_IN'],
    ['CATALOGUE_BUILT-IN', 'CATALOGUE_BUILT_IN'],
    ['catalogue_built_in', 'CATALOGUE_BUILT_IN'],
    ['CATALOG', 'CATALOGUE'],
  ])('refuses %s, which would leave other aeroplanes on file than was meant', (name, meant) => {
    expect(() => readConfig({ [name]: 'off' })).toThrow(`there is no setting ${name}; perhaps ${meant} was meant`);
  });

  it('leaves other variables alone', () => {
    const others = { CATALOGUE_PORT: 'tcp://10.0.0.1:80', CATALOGUE_SERVICE_HOST: '10.0.0.1', CATALINA_HOME: '/opt' };
    expect(readConfig(others)).toEqual(readConfig({}));
  });
});
