import { Injectable } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { Config } from '../config/config.js';

export interface Letter {
  readonly to: string;
  readonly subject: string;
  readonly body: string;
}

const FROM = 'Merestone <no-reply@merestone.example>';

/** The way to the mail server, if the settings name one. */
@Injectable()
export class MailTransport {
  private readonly transporter: Transporter | undefined;

  constructor(config: Config) {
    this.transporter = config.smtpUrl === undefined ? undefined : createTransport(config.smtpUrl);
  }

  get connected(): boolean {
    return this.transporter !== undefined;
  }

  async send({ to, subject, body }: Letter): Promise<void> {
    await this.transporter?.sendMail({ from: FROM, to, subject, text: body });
  }
}
