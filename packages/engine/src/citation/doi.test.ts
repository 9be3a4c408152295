import { describe, expect, it } from 'vitest';
import { doiKey, readDoi } from './doi.js';

describe('readDoi', () => {
  // The first three are names in use; the prefix with a subdivided registrant code is of ISO 26324's form.
  it.each([
    ['10.1021/ie50293a010', '10.1021/ie50293a010'],
    ['10.1016/S0009-2509(00)00341-1', '10.1016/S0009-2509(00)00341-1'],
    ['10.1002/(SICI)1097-0290(19960520)50:4<1::AID-BIT1>3.0.CO;2-Z', undefined],
    ['10.1000.10/123', '10.1000.10/123'],
    ['  doi:10.1021/i160017a002 ', '10.1021/i160017a002'],
    ['DOI 10.1021/i160017a002', '10.1021/i160017a002'],
    ['https://doi.org/10.1021/i160017a002', '10.1021/i160017a002'],
    ['http://dx.doi.org/10.1021/i160017a002', '10.1021/i160017a002'],
    ['doi.org/10.1021/i160017a002', '10.1021/i160017a002'],
    ['info:doi/10.1021/i160017a002', '10.1021/i160017a002'],
    ['urn:doi:10.1021/i160017a002', '10.1021/i160017a002'],
    ['https://doi.org/10.1016%2FS0009-2509%2800%2900341-1', '10.1016/S0009-2509(00)00341-1'],
    ['10.1021/i160017a002.', '10.1021/i160017a002'],
  ])('reads %s', (text, name) => {
    expect(readDoi(text)?.name).toBe(name ?? text);
  });

  it.each([
    '',
    '10.1021',
    '10.1021/',
    '10.12/abc',
    '11.1021/abc',
    '10.1021x/abc',
    '10.1021./abc',
    '10.1021/a b',
    '10.1021/a\u0000b',
    '10.1021/\ud800',
    'https://example.org/10.1021/abc',
    'https://doi.org/10.1021/%E0%A4%A',
    'javascript:alert(1)//10.1021/abc',
    `10.1021/${'a'.repeat(400)}`,
    `10.1021/${'a'.repeat(1_000_000)}`,
  ])('refuses %j', (text) => {
    expect(readDoi(text)).toBeUndefined();
  });

  it('writes an address that leads to the name, whatever its characters', () => {
    expect(readDoi('10.1000/a#b?c<d>')?.href).toBe('https://doi.org/10.1000/a%23b%3Fc%3Cd%3E');
  });

  it('compares names without regard to case', () => {
    expect(doiKey('10.1021/IE50293A010')).toBe(doiKey('10.1021/ie50293a010'));
  });
});
