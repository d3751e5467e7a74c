import { describe, expect, it } from 'vitest';
import { readablePart } from '../../../src/contract/proofread/readable-part.ts';
import { exampleDefinition } from '../../../src/http/document/example-definition.ts';

type Tree = Record<string, unknown>;
const definition = () => structuredClone(exampleDefinition) as unknown as Tree;
const at = (tree: Tree, pointer: string): Tree =>
  pointer
    .split('/')
    .slice(1)
    .reduce<unknown>((node, step) => (node as Tree)[step], tree) as Tree;
const having = (pointer: string, name: string, value: unknown) => {
  const tree = definition();
  const parent = at(tree, pointer);
  if (value === undefined) delete parent[name];
  else parent[name] = value;
  return readablePart(tree);
};
const told = ({ faults }: ReturnType<typeof readablePart>) => faults.map(({ code, pointer }) => `${code} ${pointer}`);

describe('readablePart', () => {
  it('is the whole of a definition without a fault', () => {
    const part = readablePart(definition());
    expect(part.faults).toEqual([]);
    expect(part.definition).toEqual(exampleDefinition);
    expect(part.remainder.leftOut).toEqual([]);
  });

  it('leaves out an optional member with a wrong unit and keeps the rest', () => {
    const part = having('/masses', 'empty', { value: 680, unit: 'stone' });
    expect(told(part)).toEqual(['unknown-unit /masses/empty/unit']);
    expect(part.remainder.leftOut).toContain('/masses/empty');
    expect(part.definition?.masses).toEqual({ maximumTakeoff: { value: 1050, unit: 'kg' } });
  });

  it('leaves out a member that no definition has', () => {
    const part = having('', 'colour', 'blue');
    expect(told(part)).toEqual(['unknown-member /colour']);
    expect(part.definition).toBeDefined();
  });

  it('leaves out a sheet and keeps the numbers of the others', () => {
    const tree = definition();
    const manual = tree['flightManual'] as { tables: Tree[] };
    manual.tables.unshift({ ...(manual.tables[0] as Tree), id: 'first', columns: 'none' });
    const part = readablePart(tree);
    expect(told(part)).toEqual(['wrong-type /flightManual/tables/0/columns']);
    expect(part.remainder.leftOut).toEqual(['/flightManual/tables/0']);
    expect(part.definition?.flightManual?.tables?.map(({ id }) => id)).toEqual(['takeoff-10-short-field']);
    expect(part.remainder.numbers.tables).toEqual([1]);
  });

  it('points into the definition as it came where an earlier sheet is left out', () => {
    const tree = definition();
    const manual = tree['flightManual'] as { tables: Tree[] };
    const [table] = structuredClone(manual.tables) as [Tree];
    (table['rows'] as number[][])[4] = [2000, 20, 1110, 1010];
    manual.tables = [{ ...table, id: 'first', columns: 'none' }, table];
    const part = readablePart(tree);
    expect(told(part)).toEqual(
      ['wrong-type /flightManual/tables/0/columns', 'contradiction /flightManual/tables/1/rows/4/3'].concat(
        told(part).slice(2),
      ),
    );
    expect(part.definition?.flightManual?.tables).toHaveLength(1);
  });

  it('keeps a table with a slip in a cell, and says which', () => {
    const tree = definition();
    const manual = tree['flightManual'] as { tables: { rows: number[][] }[] };
    (manual.tables[0] as { rows: number[][] }).rows[4] = [2000, 20, 1110, 1010];
    const part = readablePart(tree);
    expect(told(part)[0]).toBe('contradiction /flightManual/tables/0/rows/4/3');
    expect(part.definition?.flightManual?.tables).toHaveLength(1);
  });

  it('leaves out an indicated stall speed that no calibration tells', () => {
    const tree = definition();
    (at(tree, '/configurations/takeoff-10/maximumLift') as Tree)['type'] = 'ias';
    const part = readablePart(tree);
    expect(told(part)).toEqual(['missing /airspeedCalibration']);
    expect(Object.keys(part.definition?.configurations ?? {})).toEqual(['landing-30']);
  });

  it('tells a configuration whose figures contradict each other from the rest', () => {
    const part = having('/configurations/takeoff-10', 'groundLiftCoefficient', 2.4);
    expect(told(part)).toEqual(['contradiction /configurations/takeoff-10/groundLiftCoefficient']);
    expect([...part.faulty]).toEqual(['takeoff-10']);
  });

  it('reads nothing where a required member is missing, and says so', () => {
    const part = having('', 'wing', undefined);
    expect(told(part)).toEqual(['missing /wing']);
    expect(part.definition).toBeUndefined();
  });

  it('reads nothing of an empty object', () => {
    const part = readablePart({});
    expect(part.definition).toBeUndefined();
    expect(part.faults.length).toBeGreaterThan(8);
  });
});
