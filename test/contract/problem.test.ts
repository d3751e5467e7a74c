import { describe, expect, it } from 'vitest';
import { type ProblemCode, problem, problemForms, problemOf, toProblem } from '../../src/contract/problem.ts';
import { faultCodes } from '../../src/planning/fault.ts';

describe('problems', () => {
  it('have a form for each code of a fault', () => {
    for (const code of faultCodes) expect(problemForms[code].status).toBeOneOf([400, 422]);
  });

  it('are in their own schema, each code', () => {
    for (const code of Object.keys(problemForms) as ProblemCode[]) {
      const body = problemOf(code, 'A sentence.');
      expect(problem.parse(body)).toEqual(body);
    }
  });

  it('tell one fault with its place', () => {
    const fault = { pointer: '/mass/value', code: 'out-of-range' as const, message: '5 kg is outside the range.' };
    expect(toProblem({ refused: [fault] })).toMatchObject({
      status: 422,
      code: 'out-of-range',
      detail: '5 kg is outside the range. (at /mass/value)',
      errors: [fault],
    });
  });

  it('tell several by their number, with the code of the first, and at most a hundred', () => {
    const fault = { pointer: '', code: 'missing' as const, message: 'The member mass is missing.' };
    const body = toProblem({ refused: Array(120).fill(fault) });
    expect(body).toMatchObject({ code: 'missing', detail: '120 faults; the first: The member mass is missing.' });
    expect(body.errors).toHaveLength(100);
    expect(problem.safeParse(body).success).toBe(true);
  });
});
