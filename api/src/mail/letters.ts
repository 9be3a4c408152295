import type { NoticeKind } from '../common/notice-kinds.js';

/** Every text that leaves by mail. Subjects say what it is about and nothing that a passer-by should not read. */
export interface LetterText {
  readonly subject: string;
  readonly body: string;
  readonly link?: string;
}

interface Greeted {
  readonly officeName: string;
  /** Whom it is written to. */
  readonly name: string;
}

function paragraphs(name: string, ...texts: string[]): string {
  return [`Good day ${name},`, ...texts].join('\n\n');
}

export function invitationLetter(given: Greeted & { invitedBy: string; link: string }): LetterText {
  const { officeName, name, invitedBy, link } = given;
  return {
    subject: 'Merestone: your invitation',
    body: paragraphs(
      name,
      `${invitedBy} invites you to the register of correlations of ${officeName}.`,
      'Whoever was not expecting this can leave it alone: without the link nothing happens.',
      'Choose your password here within seven days. The link works once:',
    ),
    link,
  };
}

export function passwordResetLetter(given: Greeted & { link: string }): LetterText {
  const { officeName, name, link } = given;
  return {
    subject: 'Merestone: a new password',
    body: paragraphs(
      name,
      `Somebody asked for a new password for your address at ${officeName}.`,
      'If that was not you, leave this alone: your password stays as it is.',
      'Choose a new password here within an hour. The link works once:',
    ),
    link,
  };
}

export function passwordChangedLetter({ officeName, name }: Greeted): LetterText {
  return {
    subject: 'Merestone: your password was changed',
    body: paragraphs(
      name,
      `Your password at ${officeName} was changed, and your other sessions were ended.`,
      'If that was not you, tell an administrator of the office at once.',
    ),
  };
}

const NOTICE_SUBJECTS: Record<NoticeKind, string> = {
  'review-asked': 'a review is asked of you',
  comment: 'a comment',
  verdict: 'a verdict',
  approval: 'an approval',
  withdrawal: 'taken out of use',
  reminder: 'a reminder',
  appointment: 'an appointment',
  report: 'a problem report',
};

export function noticeLetter(
  given: Greeted & { kind: NoticeKind; text: string; address: string; choices: string },
): LetterText {
  const { officeName, name, kind, text, address, choices } = given;
  return {
    subject: `Merestone: ${NOTICE_SUBJECTS[kind]}`,
    body: paragraphs(
      name,
      text,
      `See ${address}`,
      `${officeName}. Which notices come by mail is yours to choose: ${choices}`,
    ),
  };
}
