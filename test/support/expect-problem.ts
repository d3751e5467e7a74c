import { expect } from 'vitest';
import { type Problem, type ProblemCode, problem, problemForms } from '../../src/contract/problem.ts';

interface Answered {
  readonly statusCode: number;
  readonly headers: Readonly<Record<string, unknown>>;
  readonly body: string;
}

/** Holds an answer to the form every problem has, and returns its body. */
export function expectProblem(answered: Answered, code: ProblemCode): Problem {
  const body = problem.parse(JSON.parse(answered.body));
  expect(body.code).toBe(code);
  expect(answered.statusCode).toBe(problemForms[code].status);
  expect(body).toMatchObject({
    status: answered.statusCode,
    type: `/problems/${code}`,
    title: problemForms[code].title,
  });
  expect(answered.headers['content-type']).toMatch(/^application\/problem\+json/);
  expect(answered.headers['cache-control']).toBe('no-store');
  expect(answered.headers['x-content-type-options']).toBe('nosniff');
  expect(answered.headers).not.toHaveProperty('server');
  expect(answered.headers).not.toHaveProperty('x-powered-by');
  return body;
}
