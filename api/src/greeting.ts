import type { AddressInfo } from 'node:net';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Config } from './config/config.js';
import { DEMO_PASSWORD, demoPeople } from './people/demo-people.js';
import { FirstAdministratorService } from './invitations/first-administrator.service.js';
import { OfficeService } from './people/office.service.js';
import { PeopleService } from './people/people.service.js';

/** What the terminal says once the server can be used: where it is, and how to sign in. */
export function greeting(app: NestExpressApplication): string {
  const config = app.get(Config);
  const { port } = app.getHttpServer().address() as AddressInfo;
  const address = config.origin ?? `http://localhost:${port}`;
  const lines = ['', `Merestone is at ${address}`];
  if (app.get(OfficeService).isDemo()) {
    const people = demoPeople(app.get(PeopleService).list());
    lines.push(
      '',
      `This is a demo office; the people are invented. All sign in with the password ${DEMO_PASSWORD}`,
    );
    lines.push(
      ...people.map(({ email, name, roles }) => `  ${email.padEnd(36)}${roles.join(', ').padEnd(24)}${name}`),
    );
  }
  const firstLink = app.get(FirstAdministratorService).open(address);
  if (firstLink !== undefined) {
    lines.push(
      '',
      'There is no administrator yet. This link lets the first one in, once and within seven days:',
      `  ${firstLink}`,
    );
  }
  return `${lines.join('\n')}\n\n`;
}
