import { Injectable } from '@nestjs/common';
import type { Actor } from '../common/actor.js';
import { NOTICE_KINDS, type NoticeKind } from '../common/notice-kinds.js';
import { ApiProblem } from '../common/problem.js';
import { Writer } from '../database/write.js';
import {
  noticeItem,
  type NoticeChoices,
  type NoticeItem,
  type NoticesResponse,
} from './dto/notices-response.dto.js';
import type { ListNoticesDto } from './dto/notices-query.dto.js';
import { NoticeRepository } from './notice.repository.js';

const PAGE = 50;

/** What somebody does with their own notices; those of others are not there. */
@Injectable()
export class OwnNoticesService {
  constructor(
    private readonly notices: NoticeRepository,
    private readonly writer: Writer,
  ) {}

  list(actor: Actor, { cursor, limit }: ListNoticesDto): NoticesResponse {
    const wanted = Number(limit ?? PAGE);
    const rows = this.notices.latestBelow(actor.id, Number(cursor ?? Number.MAX_SAFE_INTEGER), wanted + 1);
    const items = rows.slice(0, wanted).map(noticeItem);
    const last = items.at(-1);
    return {
      items,
      unread: this.notices.unread(actor.id),
      nextCursor: rows.length > wanted && last !== undefined ? String(last.id) : null,
    };
  }

  /** The time of the first reading stands; reading again is no act. */
  read(actor: Actor, id: number): NoticeItem {
    const row = this.notices.ofPerson(actor.id, id);
    if (row === undefined) throw new ApiProblem('not-found', 'You have no such notice.');
    if (row.readAt !== null) return noticeItem(row);
    return this.writer.write(actor, 'notice.read', (tx, at) => {
      const readAt = this.notices.ofPerson(actor.id, id, tx)?.readAt ?? at;
      this.notices.setRead(tx, id, readAt);
      return {
        subject: `notices/${id}`,
        detail: { kind: row.kind, href: row.href },
        result: noticeItem({ ...row, readAt }),
      };
    });
  }

  choices(actor: Actor): NoticeChoices {
    const chosen = this.notices.choices(actor.id);
    const mail = Object.fromEntries(NOTICE_KINDS.map((kind) => [kind, chosen.get(kind) ?? true]));
    return { mail: mail as Record<NoticeKind, boolean> };
  }

  /** Kinds that are left out stay as they are. */
  choose(actor: Actor, mail: Partial<Record<NoticeKind, boolean>>): NoticeChoices {
    const given = NOTICE_KINDS.flatMap((kind) =>
      mail[kind] === undefined ? [] : [{ kind, by: mail[kind] }],
    );
    this.writer.write(actor, 'notices.chosen', (tx) => {
      for (const { kind, by } of given) this.notices.choose(tx, actor.id, kind, by);
      return {
        subject: `people/${actor.id}`,
        detail: { mail: Object.fromEntries(given.map(({ kind, by }) => [kind, by])) },
        result: undefined,
      };
    });
    return this.choices(actor);
  }
}
