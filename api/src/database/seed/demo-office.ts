import type { Actor } from '../../common/actor.js';

/** Who works on one sheet. */
export interface DemoTeam {
  readonly originator: Actor;
  readonly reviewers: readonly [Actor, Actor];
  readonly authority: Actor;
}

/** Who does what while the demo office's library is brought in: several of each, in turn, so that all have work. */
export class DemoOffice {
  private readonly engineers: readonly Actor[];
  private readonly reviewers: readonly Actor[];
  private readonly authorities: readonly Actor[];
  readonly administrator: Actor;

  constructor(people: readonly Actor[]) {
    const only = (role: Actor['roles'][number]) => people.filter(({ roles }) => roles.includes(role));
    this.reviewers = only('reviewer');
    this.authorities = only('authority');
    // Whoever reviews or approves does not originate here, so that the four-eyes rule holds whatever the turn.
    this.engineers = only('engineer').filter(({ roles }) => roles.length === 1);
    const [administrator] = only('administrator');
    if (
      administrator === undefined ||
      this.engineers.length < 1 ||
      this.reviewers.length < 2 ||
      this.authorities.length < 1
    ) {
      throw new Error('A demo office needs an engineer, two reviewers, an authority and an administrator.');
    }
    this.administrator = administrator;
  }

  /** The team of the n-th sheet. */
  team(n: number): DemoTeam {
    return {
      originator: inTurn(this.engineers, n),
      reviewers: [inTurn(this.reviewers, n), inTurn(this.reviewers, n + 1)],
      authority: inTurn(this.authorities, n),
    };
  }
}

function inTurn(people: readonly Actor[], n: number): Actor {
  const person = people[n % people.length];
  if (person === undefined) throw new RangeError('There is nobody to take a turn.');
  return person;
}
