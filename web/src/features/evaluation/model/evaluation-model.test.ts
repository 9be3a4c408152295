import { describe, expect, it } from 'vitest';
import { compileCorrelation, compilePropertyEquation } from '@merestone/engine';
import { gillilandSherwood, idealGasDryAir } from '../../../shared/samples/gilliland-sherwood';
import { wettedArea } from '../../../shared/samples/packing-sample';
import { sampleSheet } from '../../../shared/samples/sheets';
import { buildForm } from './build-form';
import { buildRequest } from './build-request';
import { EMPTY_DUTY, changeDuty, type Duty, type DutyChange } from './duty';
import { fieldsOf } from './duty-form';
import { fieldErrors } from './field-error';
import { filledValues } from './filled-values';
import { givenGroups } from './given-groups';
import { previewOf } from './preview';
import { readStoredDuty, storeDuty } from './stored-duty';

const sheet = sampleSheet();
const packing = sampleSheet(wettedArea, { slug: 'onda-wetted-area', equations: [] });
const correlation = compileCorrelation(gillilandSherwood);
const equation = compilePropertyEquation('ideal-gas-dry-air', idealGasDryAir);
if (!correlation.ok || !equation.ok) throw new Error('the samples do not compile');
const engine = { compiled: correlation.compiled, library: () => equation.compiled };

function dutyOf(...changes: DutyChange[]): Duty {
  return changes.reduce(changeDuty, EMPTY_DUTY);
}

function typed(entries: Record<string, [string, string]>): DutyChange[] {
  return Object.entries(entries).map(([key, [text, unit]]) => ({ do: 'type', key, typed: { text, unit } }));
}

/** Air at 25 °C and 1 atm in a 25 mm tube: Re about 8 900, Sc about 0.61. */
const AIR: Record<string, [string, string]> = {
  d: ['25', 'mm'],
  T: ['25', 'degC'],
  P: ['101.325', 'kPa'],
  u: ['5.5', 'm/s'],
  rho: ['1.184', 'kg/m^3'],
  mu: ['1.84e-5', 'Pa s'],
  D: ['2.54e-5', 'm^2/s'],
  p_BM: ['99.8', 'kPa'],
};

function previewFor(duty: Duty) {
  const sections = buildForm(sheet, duty);
  return previewOf(engine, buildRequest(sections, duty), sections);
}

describe('the form made from a definition', () => {
  it('asks for geometry first, then temperature and pressure, then what follows from them', () => {
    const sections = buildForm(sheet, EMPTY_DUTY);
    expect(sections.map((section) => section.title)).toEqual(['Geometry', 'Fluid and conditions']);
    expect(fieldsOf(sections).map((field) => field.key)).toEqual([
      'd',
      'T',
      'P',
      'u',
      'rho',
      'mu',
      'D',
      'p_BM',
    ]);
  });

  it('labels a field with the dictionary title and offers units of its dimension', () => {
    const d = fieldsOf(buildForm(sheet, EMPTY_DUTY)).find((field) => field.key === 'd');
    expect(d?.label).toBe('Tube inside diameter');
    expect(d?.units).toEqual(expect.arrayContaining(['m', 'mm', 'in']));
    expect(d?.units).not.toContain('kg/m^3');
  });

  it('leaves out what a chosen row gives, and shows it again when the row is taken back', () => {
    const chosen = dutyOf({ do: 'choose-row', key: 'packing', row: 'pall-steel-25' });
    expect(fieldsOf(buildForm(packing, chosen)).map((f) => f.key)).toEqual(['L', 'rho', 'mu', 'sigma']);
    const back = changeDuty(chosen, { do: 'choose-row', key: 'packing', row: null });
    expect(fieldsOf(buildForm(packing, back)).map((f) => f.key)).toContain('a_t');
  });

  it('asks for groups in place of the quantities that serve nothing else', () => {
    const { groups, replaced } = givenGroups(gillilandSherwood);
    expect(groups.map((group) => group.symbol)).toEqual(['Re', 'Sc']);
    expect([...replaced].sort()).toEqual(['mu', 'rho', 'u']);
    const sections = buildForm(sheet, dutyOf({ do: 'switch-mode', mode: 'groups' }));
    expect(fieldsOf(sections).map((field) => field.key)).toEqual(['Re', 'Sc', 'd', 'T', 'P', 'D', 'p_BM']);
  });
});

describe('the request', () => {
  it('carries numbers as typed, with the chosen units', () => {
    const duty = dutyOf(...typed(AIR));
    const { request, errors } = buildRequest(buildForm(sheet, duty), duty);
    expect(errors).toEqual([]);
    expect(request.inputs.T).toEqual({ value: 25, unit: 'degC' });
    expect(request.inputs.D).toEqual({ value: 2.54e-5, unit: 'm^2/s' });
  });

  it('sends no hidden field: an equation replaces the typed density', () => {
    const duty = dutyOf(...typed(AIR), { do: 'choose-equation', key: 'rho', slug: 'ideal-gas-dry-air' });
    const { request } = buildRequest(buildForm(sheet, duty), duty);
    expect(request.inputs).not.toHaveProperty('rho');
    expect(request.equations).toEqual({ rho: 'ideal-gas-dry-air' });
  });

  it('is held up by a comma and by a changed unit', () => {
    const duty = dutyOf(...typed({ ...AIR, u: ['5,5', 'm/s'] }), {
      do: 'type',
      key: 'T',
      typed: { text: '25', unit: 'K', unitBefore: 'degC' },
    });
    const { errors } = buildRequest(buildForm(sheet, duty), duty);
    expect(errors.map((error) => error.field)).toEqual(['T', 'u']);
  });
});

describe('the preview', () => {
  // Re = 1.184·5.5·0.025/1.84e-5 = 8847.8; Sc = 1.84e-5/(1.184·2.54e-5) = 0.61184;
  // Sh = 0.023·8847.8^0.83·0.61184^0.44 = 34.97; k_c = Sh·D/d·P/p_BM = 0.03607 m/s
  it('computes groups, result and coefficient', () => {
    const preview = previewFor(dutyOf(...typed(AIR)));
    if (preview.state !== 'outcome' || preview.outcome.outcome !== 'within') throw new Error(preview.state);
    expect(preview.outcome.groups.Re).toBeCloseTo(8847.83, 1);
    expect(preview.outcome.result.value).toBeCloseTo(34.97, 1);
    expect(preview.outcome.coefficient?.value).toBeCloseTo(0.03607, 4);
  });

  it('refuses past the bound of the data, with a finding', () => {
    const preview = previewFor(dutyOf(...typed({ ...AIR, u: ['32', 'm/s'] })));
    if (preview.state !== 'outcome' || preview.outcome.outcome !== 'refused') throw new Error(preview.state);
    expect(preview.outcome.findings.find((f) => f.symbol === 'Re')?.deviable).toBe(true);
  });

  it('names what is missing by field', () => {
    const preview = previewFor(dutyOf(...typed({ d: ['25', 'mm'] })));
    expect(preview.state === 'incomplete' ? preview.missing.map((m) => m.field).sort() : []).toEqual([
      'D',
      'mu',
      'rho',
      'u',
    ]);
  });

  it('leads a missing input of an equation to the field of the sheet that serves it', () => {
    const duty = dutyOf(...typed({ d: ['25', 'mm'] }), {
      do: 'choose-equation',
      key: 'rho',
      slug: 'ideal-gas-dry-air',
    });
    const sections = buildForm(sheet, duty);
    const errors = fieldErrors([{ code: 'missing', field: 'inputs.rho.T', message: 'needed' }], sections);
    expect(errors).toEqual([{ field: 'T', message: 'needed' }]);
  });
});

describe('filled values', () => {
  it('are there as soon as the equation has its inputs', () => {
    const duty = dutyOf(...typed({ T: ['15', 'degC'], P: ['101325', 'Pa'] }), {
      do: 'choose-equation',
      key: 'rho',
      slug: 'ideal-gas-dry-air',
    });
    const sections = buildForm(sheet, duty);
    // U.S. Standard Atmosphere 1976: 1.2250 kg/m³ at 15 °C and 101 325 Pa
    expect(
      filledValues(engine.library, buildRequest(sections, duty), sections).get('rho')?.value,
    ).toBeCloseTo(1.225, 3);
  });
});

describe('a filled value outside the range of its equation', () => {
  it('is not shown as a value, and says why', () => {
    const duty = dutyOf(...typed({ T: ['900', 'degC'], P: ['101325', 'Pa'] }), {
      do: 'choose-equation',
      key: 'rho',
      slug: 'ideal-gas-dry-air',
    });
    const sections = buildForm(sheet, duty);
    const filled = filledValues(engine.library, buildRequest(sections, duty), sections);
    expect(filled.get('rho')?.outside).toMatch(/above the upper bound/);
  });
});

describe('the stored duty', () => {
  it('comes back word for word, and anything of another form is left out', () => {
    const duty = dutyOf(...typed({ u: [' 2 000', 'm/s'], d: ['3.20', 'mm'] }), {
      do: 'give-reason',
      symbol: 'Re',
      reason: 'because',
    });
    storeDuty(window.localStorage, 'k', duty);
    expect(readStoredDuty(window.localStorage, 'k')).toEqual(duty);
    window.localStorage.setItem(
      'k',
      '{"typed":{"u":{"text":5},"__proto__":{"text":"1","unit":"m"}},"mode":"x"}',
    );
    expect(readStoredDuty(window.localStorage, 'k')).toEqual(EMPTY_DUTY);
    window.localStorage.setItem('k', 'not json');
    expect(readStoredDuty(window.localStorage, 'k')).toEqual(EMPTY_DUTY);
  });
});
