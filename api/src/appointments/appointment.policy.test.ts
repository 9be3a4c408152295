import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Actor } from '../common/actor.js';
import { ROLES, type Role } from '../common/roles.js';
import {
  coveredBy,
  mayBeProposed,
  mayConfirm,
  mayEnd,
  mayLastUntil,
  stateAt,
  type AppointmentFacts,
} from './appointment.policy.js';

const AT = '2026-06-15T12:00:00.000Z';
const person = (id: string, ...roles: Role[]): Actor => ({ id, name: id, roles });
const appointment = (overrides: Partial<AppointmentFacts> = {}): AppointmentFacts => ({
  personId: 'candidate',
  geometries: ['tube'],
  until: '2027-06-15',
  proposedById: 'proposer',
  confirmedAt: '2026-06-01T00:00:00.000Z',
  endedAt: null,
  ...overrides,
});

describe('an appointment', () => {
  it('is proposed, current until the end of its last day, then ended', () => {
    expect(stateAt(appointment({ confirmedAt: null }), AT)).toBe('proposed');
    expect(stateAt(appointment(), AT)).toBe('current');
    expect(stateAt(appointment(), '2027-06-15T23:59:59.999Z')).toBe('current');
    expect(stateAt(appointment(), '2027-06-16T00:00:00.000Z')).toBe('ended');
    expect(stateAt(appointment({ endedAt: AT }), AT)).toBe('ended');
  });

  it('covers its geometries alone, and property equations where it covers all', () => {
    expect(coveredBy([appointment()], 'tube', AT)).toBe(true);
    expect(coveredBy([appointment()], 'ball', AT)).toBe(false);
    expect(coveredBy([appointment()], null, AT)).toBe(false);
    const all = appointment({ geometries: null });
    expect([coveredBy([all], 'ball', AT), coveredBy([all], null, AT)]).toEqual([true, true]);
    expect(coveredBy([appointment(), appointment({ geometries: ['ball'] })], 'ball', AT)).toBe(true);
  });

  it('covers nothing while it is only proposed, nor after its end, whatever its scope', () => {
    fc.assert(
      fc.property(
        fc.constantFrom<Partial<AppointmentFacts>>(
          { confirmedAt: null },
          { endedAt: AT },
          { until: '2026-06-14' },
        ),
        fc.option(fc.subarray(['tube', 'ball', 'bed'])),
        fc.constantFrom('tube', 'ball', null),
        (over, geometries, geometry) => {
          expect(coveredBy([appointment({ ...over, geometries })], geometry, AT)).toBe(false);
        },
      ),
    );
  });

  it('lasts until a day after today, ten years at most', () => {
    expect(mayLastUntil('2026-06-15', AT).allowed).toBe(false);
    expect(mayLastUntil('2026-06-16', AT).allowed).toBe(true);
    expect(mayLastUntil('2036-06-15', AT).allowed).toBe(true);
    expect(mayLastUntil('2036-06-16', AT).allowed).toBe(false);
  });

  it('is for nobody who is administrator, away, or proposes themselves', () => {
    const by = person('proposer', 'administrator');
    expect(mayBeProposed(by, person('candidate', 'engineer', 'reviewer')).allowed).toBe(true);
    expect(mayBeProposed(by, person('candidate', 'administrator')).allowed).toBe(false);
    expect(mayBeProposed(by, undefined).allowed).toBe(false);
    expect(mayBeProposed(by, person('proposer', 'engineer')).allowed).toBe(false);
  });
});

describe('confirming', () => {
  const proposed = appointment({ confirmedAt: null });
  const confirming = (actor: Actor, isAuthority = false, isPrincipal = false) => ({
    actor,
    person: person('candidate', 'engineer') as Actor | undefined,
    isAuthority,
    isPrincipal,
    at: AT,
  });

  it('is for another authority or the principal', () => {
    expect(mayConfirm(proposed, confirming(person('other', 'authority'), true)).allowed).toBe(true);
    expect(mayConfirm(proposed, confirming(person('other', 'auditor'), false, true)).allowed).toBe(true);
  });

  it('never is for one of the two already in it, nor for an administrator, whoever they are besides', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('candidate', 'proposer', 'other'),
        fc.subarray([...ROLES]),
        fc.boolean(),
        fc.boolean(),
        (id, roles, isAuthority, isPrincipal) => {
          const { allowed } = mayConfirm(
            proposed,
            confirming(person(id, ...roles), isAuthority, isPrincipal),
          );
          const entitled = isAuthority || isPrincipal;
          expect(allowed).toBe(entitled && id === 'other' && !roles.includes('administrator'));
        },
      ),
    );
  });

  it('happens once, in time, and for somebody who is still here and no administrator', () => {
    const principal = confirming(person('other', 'engineer'), false, true);
    expect(mayConfirm(appointment(), principal)).toMatchObject({ allowed: false, code: 'conflict' });
    expect(mayConfirm(appointment({ confirmedAt: null, endedAt: AT }), principal).allowed).toBe(false);
    expect(mayConfirm({ ...proposed, until: '2026-06-14' }, principal).allowed).toBe(false);
    expect(mayConfirm(proposed, { ...principal, person: undefined }).allowed).toBe(false);
    const turned = person('candidate', 'administrator');
    expect(mayConfirm(proposed, { ...principal, person: turned }).allowed).toBe(false);
  });

  it('and ending happen no more after the end', () => {
    expect(mayEnd(appointment(), AT).allowed).toBe(true);
    expect(mayEnd(appointment({ confirmedAt: null }), AT).allowed).toBe(true);
    expect(mayEnd(appointment({ endedAt: AT }), AT)).toMatchObject({ allowed: false, code: 'conflict' });
  });
});
