import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';

const ONE_YEAR_S = 31_536_000;

/** Serves the built screens: files as they are, and the page itself at every address that is a screen's. */
export function serveScreens(app: NestExpressApplication, webFolder: string): void {
  const page = join(webFolder, 'index.html');
  if (!existsSync(page)) return;
  app.useStaticAssets(webFolder, {
    index: false,
    setHeaders: (response: Response, path: string) => {
      // Files under assets/ carry a hash of their content in the name.
      const lasting = path.startsWith(join(webFolder, 'assets'));
      response.setHeader('Cache-Control', lasting ? `public, max-age=${ONE_YEAR_S}, immutable` : 'no-cache');
    },
  });
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (!isScreen(request)) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page);
  });
}

function isScreen({ method, path }: Request): boolean {
  if (method !== 'GET' && method !== 'HEAD') return false;
  return path !== '/api' && !path.startsWith('/api/') && !path.startsWith('/assets/');
}
