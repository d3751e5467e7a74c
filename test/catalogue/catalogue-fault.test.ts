import { describe, expect, it } from 'vitest';
import { CatalogueFault } from '../../src/catalogue/catalogue-fault.ts';

describe('CatalogueFault', () => {
  it('is one line, whatever the names and the findings hold', () => {
    const fault = new CatalogueFault('a\nb', 'c\r\u2028d \ud800 e\u0085f');
    expect(fault).toBeInstanceOf(Error);
    expect(fault.name).toBe('CatalogueFault');
    expect(fault.message).toBe('catalogue a\ufffdb: c\ufffd\ufffdd \ufffd e\ufffdf');
  });
});
