import { readdirSync, readFileSync } from 'node:fs';
import { basename } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import {
  checkPropertyStructure,
  checkStructure,
  compileCorrelation,
  compilePropertyEquation,
  evaluate,
  runChecks,
  runPropertyChecks,
  serves,
  type CheckReport,
  type CompiledCorrelation,
  type CompiledEquation,
  type CorrelationDefinition,
  type EvaluationRequest,
} from './index.js';

/**
 * The library that ships with the program: every sheet and property equation is well formed, its dimensions close,
 * and it reproduces its worked checks. Their sources stand beside them in the files.
 */
const FIXTURES = new URL('../../../fixtures/', import.meta.url);

interface Entry {
  slug: string;
  folder: string;
  content: unknown;
}

function read(path: string): unknown {
  return parse(readFileSync(new URL(path, FIXTURES), 'utf8'));
}

function entriesOf(folder: string): Entry[] {
  const names = readdirSync(fileURLToPath(new URL(`${folder}/`, FIXTURES)), { recursive: true });
  return names
    .map((name) => String(name).replaceAll('\\', '/'))
    .filter((name) => name.endsWith('.yaml'))
    .map((name) => ({
      slug: basename(name, '.yaml'),
      folder: name.split('/').slice(0, -1).join('/'),
      content: read(`${folder}/${name}`),
    }));
}

const geometries = read('geometries.yaml') as { slug: string; cautions: string[] }[];
const equationEntries = entriesOf('properties');
const sheetEntries = entriesOf('correlations');

function equation({ slug, content }: Entry): CompiledEquation {
  const structure = checkPropertyStructure(content);
  if (!structure.ok) throw new Error(JSON.stringify(structure.problems));
  const compilation = compilePropertyEquation(slug, structure.definition);
  if (!compilation.ok) throw new Error(JSON.stringify(compilation.problems));
  return compilation.compiled;
}

function sheet({ content }: Entry): CompiledCorrelation {
  const structure = checkStructure(content);
  if (!structure.ok) throw new Error(JSON.stringify(structure.problems));
  const compilation = compileCorrelation(structure.definition);
  if (!compilation.ok) throw new Error(JSON.stringify(compilation.problems));
  return compilation.compiled;
}

/** What failed, in words, so that a red test names the check and both numbers. */
function failures(reports: CheckReport[]): string[] {
  return reports
    .filter(({ passed }) => !passed)
    .map(({ title, values, problems }) => `${title}: ${JSON.stringify({ values, problems })}`);
}

const library = new Map<string, CompiledEquation>();
function find(slug: string): CompiledEquation | undefined {
  const entry = equationEntries.find((one) => one.slug === slug);
  if (entry && !library.has(slug)) library.set(slug, equation(entry));
  return library.get(slug);
}

describe('geometries', () => {
  it('lists at least thirty, each once and with a caution', () => {
    expect(geometries.length).toBeGreaterThanOrEqual(30);
    expect(new Set(geometries.map(({ slug }) => slug)).size).toBe(geometries.length);
    expect(geometries.filter(({ cautions }) => cautions.length === 0)).toEqual([]);
  });
});

describe.each(equationEntries)('property equation $slug', (entry) => {
  it('is well formed and reproduces its worked checks', () => {
    const reports = runPropertyChecks(equation(entry));
    expect(reports.length).toBeGreaterThan(0);
    expect(failures(reports)).toEqual([]);
  });
});

describe.each(sheetEntries)('sheet $slug', (entry) => {
  it('is well formed and reproduces its worked checks', () => {
    const reports = runChecks(sheet(entry), find);
    expect(reports.length).toBeGreaterThan(0);
    expect(failures(reports)).toEqual([]);
  });

  it('stands in the folder of its geometry, which is listed', () => {
    const { geometry } = entry.content as CorrelationDefinition;
    expect(entry.folder).toBe(geometry);
    expect(geometries.map(({ slug }) => slug)).toContain(geometry);
  });

  it('names property equations that exist and give what they fill', () => {
    const wrong = (entry.content as CorrelationDefinition).quantities.flatMap((quantity) =>
      (quantity.equations ?? []).filter((slug) => {
        const filling = find(slug);
        return !filling || !serves(filling.definition.gives, quantity.is);
      }),
    );
    expect(wrong).toEqual([]);
  });

  it('names sheets that exist where it points beyond a bound', () => {
    const named = (entry.content as CorrelationDefinition).bounds.flatMap(({ stretches }) =>
      stretches.flatMap(({ lo, hi }) => [...(lo?.beyond ?? []), ...(hi?.beyond ?? [])]),
    );
    expect(named.filter((slug) => !sheetEntries.some((one) => one.slug === slug))).toEqual([]);
  });

  it('claims a published example only where it has one', () => {
    const { checks, verification } = entry.content as CorrelationDefinition;
    const published = checks.some(({ kind }) => kind === 'published');
    expect(verification.status === 'published-example' && !published).toBe(false);
  });
});

describe('the library as a whole', () => {
  it('holds at least 24 sheets over 12 geometries, each slug once', () => {
    expect(sheetEntries.length).toBeGreaterThanOrEqual(24);
    expect(new Set(sheetEntries.map(({ slug }) => slug)).size).toBe(sheetEntries.length);
    expect(new Set(sheetEntries.map(({ folder }) => folder)).size).toBeGreaterThanOrEqual(12);
  });
});

describe('duties', () => {
  function duty(slug: string, request: EvaluationRequest) {
    const entry = sheetEntries.find((one) => one.slug === slug);
    if (!entry) throw new Error(`no sheet ${slug}`);
    return evaluate(sheet(entry), request, find);
  }
  const moistAir = {
    inputs: {
      u: { value: 5 },
      d: { value: 25.4, unit: 'mm' },
      P: { value: 1, unit: 'atm' },
      T: { value: 35, unit: 'degC' },
      T_i: { value: 22, unit: 'degC' },
      phi: { value: 0.3 },
    },
    equations: {
      rho: 'air-density-ideal',
      mu: 'air-viscosity-sutherland',
      D: 'water-vapour-air-diffusivity-marrero-mason',
      p_BM: 'log-mean-inert-pressure',
      p_Ai: 'water-psat-iapws',
      p_Ab: 'water-vapour-bulk-pressure',
    },
  };

  it('fills everything of a humidifier from property equations', () => {
    // The same equations worked through by a separate script.
    const evaluation = duty('wetted-wall-gilliland-sherwood', moistAir);
    if (!evaluation.ok || evaluation.outcome.outcome === 'refused') throw new Error('refused');
    expect(evaluation.outcome.groups['Re']).toBeCloseTo(7720.529, 2);
    expect(evaluation.outcome.coefficient?.value).toBeCloseTo(0.033739079, 8);
    expect(evaluation.outcome.equations.map(({ symbol }) => symbol)).toContain('p_BM');
  });

  it('gives no coefficient where no inert gas is left at the interface', () => {
    const evaluation = duty('wetted-wall-gilliland-sherwood', {
      ...moistAir,
      inputs: { ...moistAir.inputs, T_i: { value: 101, unit: 'degC' } },
    });
    expect(evaluation).toMatchObject({ ok: true, outcome: { outcome: 'refused' } });
    const findings = evaluation.ok ? evaluation.outcome.findings : [];
    expect(findings).toContainEqual(
      expect.objectContaining({
        symbol: 'p_BM.p_Bi',
        kind: 'outside',
        nature: 'definition',
        deviable: false,
      }),
    );
  });

  it('refuses a Schmidt number at which nobody measured', () => {
    const evaluation = duty('pipe-turbulent-linton-sherwood', {
      inputs: { Re: { value: 20000 }, Sc: { value: 300 } },
    });
    expect(evaluation.ok && evaluation.outcome.outcome).toBe('refused');
  });
});
