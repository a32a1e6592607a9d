import { existsSync } from 'node:fs';
import path from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Reflector } from '@nestjs/core';
import { StandardSchemaSerializerInterceptor } from '@nestjs/common';
import cookieParser from 'cookie-parser';
import express, { type NextFunction, type Request, type Response } from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import { type Configuration, CONFIGURATION } from '../config/configuration.js';
import { NullAsJson } from './null-as-json.js';
import { setUpOpenApi } from './open-api.js';
import { refuseForeignRequests } from './foreign-requests.js';
import { validationPipe } from './validation.js';

/** Everything between the network and the controllers, the same for the server and for tests. */
export function configureApplication(app: NestExpressApplication): void {
  const configuration = app.get<Configuration>(CONFIGURATION);
  if (configuration.TRUST_PROXY !== undefined) app.set('trust proxy', configuration.TRUST_PROXY);
  app.use(helmet(securityHeaders(configuration)));
  app.use(requestLog(configuration));
  app.use(cookieParser());
  app.use('/api', refuseForeignRequests(configuration.PUBLIC_URL));
  app.use('/api', (_: Request, response: Response, next: NextFunction) => {
    response.setHeader('Cache-Control', 'no-store');
    next();
  });
  app.useGlobalPipes(validationPipe());
  app.useGlobalInterceptors(new NullAsJson(), new StandardSchemaSerializerInterceptor(app.get(Reflector)));
  app.useBodyParser('json', { limit: '1mb' });
  app.enableShutdownHooks();
  setUpOpenApi(app);
  serveClient(app, configuration);
}

function securityHeaders(configuration: Configuration): Parameters<typeof helmet>[0] {
  const https = configuration.PUBLIC_URL.startsWith('https:');
  // Browsers that read 'self' narrowly do not take it for the address of our own live changes.
  const live = new URL(configuration.PUBLIC_URL).origin.replace(/^http/, 'ws');
  return {
    strictTransportSecurity: https,
    referrerPolicy: { policy: 'same-origin' },
    contentSecurityPolicy: {
      directives: {
        defaultSrc: ["'self'"],
        // Radix Themes and tiptap set styles on elements.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        workerSrc: ["'self'", 'blob:'],
        connectSrc: ["'self'", live],
        fontSrc: ["'self'"],
        frameAncestors: ["'none'"],
        upgradeInsecureRequests: https ? [] : null,
      },
    },
  };
}

/** One line a request: method, path without its query, status, time. No bodies, no names, no query text. */
function requestLog(configuration: Configuration) {
  return pinoHttp({
    level: configuration.LOG_LEVEL,
    autoLogging: { ignore: (request) => !(request.url ?? '').startsWith('/api') },
    serializers: {
      req: (request: { method: string; url: string }) => ({
        method: request.method,
        path: (request.url.split('?')[0] ?? '').replace(/(invitations\/)[^/]+/i, '$1…'),
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  });
}

/** The built client; every path that is not of the API is a page of it. */
function serveClient(app: NestExpressApplication, configuration: Configuration): void {
  const directory =
    configuration.CLIENT_DIR ?? path.resolve(import.meta.dirname, '../../../../client/dist/app');
  const page = path.join(directory, 'index.html');
  if (!existsSync(page)) return;
  app.use(
    '/assets',
    express.static(path.join(directory, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }),
  );
  app.use(express.static(directory, { index: false }));
  app.use((request: Request, response: Response, next: NextFunction) => {
    const ours = /^\/(api|live)(\/|$)/.test(request.path);
    if (ours || (request.method !== 'GET' && request.method !== 'HEAD')) {
      next();
      return;
    }
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page);
  });
}
