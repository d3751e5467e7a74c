/** Values of the symbols that a formula may use. */
export type Values = ReadonlyMap<string, number>;

const functions: Readonly<Record<string, (...given: number[]) => number>> = {
  sqrt: Math.sqrt,
  ln: Math.log,
  exp: Math.exp,
  sin: Math.sin,
  cos: Math.cos,
  asin: Math.asin,
  abs: Math.abs,
  min: Math.min,
  max: Math.max,
};

/**
 * The value of a formula as a pocket calculator would find it.
 *
 * sum := product (('+' | '-') product)*; product := signed (('*' | '/') signed)*; signed := '-'? power;
 * power := atom ('^' signed)?; atom := number | pi | symbol | function '(' sum (',' sum)* ')' | '(' sum ')'
 *
 * @throws Error at anything else, an unknown symbol included
 */
export function evaluate(formula: string, values: Values): number {
  const tokens = formula.match(/\d+(?:\.\d+)?(?:e[-+]?\d+)?|[A-Za-z]\w*|[-+*/^(),]|\S/g) ?? [];
  let at = 0;

  const takes = (token: string): boolean => {
    if (tokens[at] !== token) return false;
    at++;
    return true;
  };
  const need = (token: string): void => {
    if (!takes(token)) throw new Error(`${token} is missing at token ${at} of ${formula}`);
  };

  function sum(): number {
    let value = product();
    for (;;) {
      if (takes('+')) value += product();
      else if (takes('-')) value -= product();
      else return value;
    }
  }

  function product(): number {
    let value = signed();
    for (;;) {
      if (takes('*')) value *= signed();
      else if (takes('/')) value /= signed();
      else return value;
    }
  }

  function signed(): number {
    return takes('-') ? -power() : power();
  }

  function power(): number {
    const base = atom();
    return takes('^') ? base ** signed() : base;
  }

  function atom(): number {
    if (takes('(')) {
      const value = sum();
      need(')');
      return value;
    }
    const token = tokens[at++] ?? '';
    if (/^\d/.test(token)) return Number(token);
    if (token === 'pi') return Math.PI;
    const known = functions[token];
    if (known !== undefined) {
      need('(');
      const given = [sum()];
      while (takes(',')) given.push(sum());
      need(')');
      return known(...given);
    }
    const value = values.get(token);
    if (value === undefined) throw new Error(`${token} is unknown in ${formula}`);
    return value;
  }

  const value = sum();
  if (at < tokens.length) throw new Error(`${tokens[at]} is left over in ${formula}`);
  return value;
}
