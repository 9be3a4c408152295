import { Injectable } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { Config } from '../config/config.js';
import { wholeText, type Letter } from './letter.js';

const SECOND_MS = 1000;

/** The way to the mail server, if the settings name one. */
@Injectable()
export class MailTransport {
  private readonly transporter: Transporter | undefined;
  private readonly from: string;

  constructor({ smtpUrl, origin }: Config) {
    this.from = senderOf(origin);
    this.transporter =
      smtpUrl === undefined
        ? undefined
        : createTransport({
            url: smtpUrl,
            connectionTimeout: 20 * SECOND_MS,
            greetingTimeout: 20 * SECOND_MS,
            socketTimeout: 60 * SECOND_MS,
            // A letter is text; nothing in it may make this server read a file or fetch an address.
            disableFileAccess: true,
            disableUrlAccess: true,
          });
  }

  get connected(): boolean {
    return this.transporter !== undefined;
  }

  async send(letter: Letter): Promise<void> {
    const { to, subject } = letter;
    const text = wholeText(letter);
    await this.transporter?.sendMail({
      from: { name: 'Merestone', address: this.from },
      // As an object, so that it is one address and never read as a list.
      to: { name: '', address: to },
      subject,
      text,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
  }
}

/** Of the host that people know the server by; without one an address that leads nowhere (RFC 2606). */
function senderOf(origin: string | undefined): string {
  const host = origin === undefined ? 'merestone.example' : new URL(origin).hostname;
  return `no-reply@${host}`;
}
