import { Injectable } from '@nestjs/common';
import type { NoticeKind } from '../common/notice-kinds.js';
import type { Tx } from '../database/connection.js';
import { Config } from '../config/config.js';
import { noticeLetter } from '../mail/letters.js';
import { oneLine } from '../mail/letter.js';
import { MailService } from '../mail/mail.service.js';
import { officeAddress } from '../mail/office-address.js';
import { PeopleService } from '../people/people.service.js';
import { SettingsService } from '../settings/settings.service.js';
import { NoticeRepository } from './notice.repository.js';

export interface Notice {
  readonly kind: NoticeKind;
  /** One sentence that says what happened and to what. */
  readonly text: string;
  /** A path in the screens, such as `/register/some-slug`. */
  readonly href: string;
  /** Of a reminder: nobody is told twice under the same key, however often it is tried. */
  readonly once?: string | undefined;
}

const LONGEST_TEXT = 500;
const PATH = /^\/(?!\/)[\w\-./~%?&=#:]*$/;

/** Tells people what they should know, in the transaction of the act that it is about. */
@Injectable()
export class NoticesService {
  constructor(
    private readonly notices: NoticeRepository,
    private readonly people: PeopleService,
    private readonly settings: SettingsService,
    private readonly mail: MailService,
    private readonly config: Config,
  ) {}

  /** Writes each of these people a notice and, unless they chose otherwise, a letter. Who is not here is left out. */
  tell(tx: Tx, at: string, personIds: Iterable<string>, notice: Notice): void {
    if (!PATH.test(notice.href))
      throw new Error(`A notice leads to a path of the screens, not to ${notice.href}`);
    for (const personId of new Set(personIds)) this.tellOne(tx, at, personId, notice);
  }

  private tellOne(tx: Tx, at: string, personId: string, { kind, text, href, once }: Notice): void {
    const person = this.people.byId(personId, tx);
    if (person?.active !== true) return;
    const line = shortened(oneLine(text));
    const told = this.notices.insert(tx, { personId, kind, text: line, href, at, onceKey: once ?? null });
    if (!told || this.notices.choices(personId, tx).get(kind) === false) return;
    this.mail.post(tx, at, {
      to: person.email,
      ...noticeLetter({
        officeName: this.settings.current(tx).officeName,
        name: person.name,
        kind,
        text: line,
        address: officeAddress(this.config, href),
        choices: officeAddress(this.config, '/account'),
      }),
    });
  }
}

function shortened(text: string): string {
  const characters = [...text];
  return characters.length <= LONGEST_TEXT ? text : `${characters.slice(0, LONGEST_TEXT - 1).join('')}…`;
}
