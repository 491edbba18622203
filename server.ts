import { existsSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { AngularNodeAppEngine, createNodeRequestHandler, isMainModule, writeResponseToNodeResponse } from '@angular/ssr/node';
import { type Express } from 'express';
import { createApi, routes } from '@api/api';
import { sitemapRoutes } from '@api/catalogue/sitemap-routes';
import { readConfig, WrongConfiguration } from '@api/config';
import { NewerDatabase } from '@api/database/open-database';
import { createDependencies, type Dependencies } from '@api/dependencies';
import { cachedPages } from '@api/http/cached-pages';
import { createInProcess } from '@api/http/in-process';
import { staticFiles } from '@api/http/static-files';
import { mailboxRoutes } from '@api/local/mailbox-routes';
import { startBackground } from '@api/local/start-background';
import { prepareMarket } from '@seeds/prepare-market';

const here = dirname(fileURLToPath(import.meta.url));

/** The folder with package.json: beside this file in development, above the bundle once built. */
function projectRoot(): string {
  let folder = here;
  while (!existsSync(join(folder, 'package.json'))) {
    const up = dirname(folder);
    if (up === folder) throw new Error('the project folder was not found');
    folder = up;
  }
  return folder;
}

const PUBLIC_PAGE = /^\/($|catalogue(\/|$)|bench$)/;

/** Composes the application: API, public pages rendered and kept, static files, everything else rendered by the client. */
export function createApplication(dependencies: Dependencies): Express {
  const { config, catalogue } = dependencies;
  const engine = new AngularNodeAppEngine({ allowedHosts: config.allowedHosts });
  const context = { api: createInProcess(routes, dependencies), publicUrl: config.publicUrl };
  const app = createApi(dependencies);

  if (config.mail.kind === 'local') app.use(mailboxRoutes(config));
  app.use(sitemapRoutes(dependencies));
  app.use(
    cachedPages(
      (path) => PUBLIC_PAGE.test(path),
      () => catalogue.version(),
      async (request) => {
        const rendered = await engine.handle(request, context);
        return rendered?.status === 200 ? rendered.text() : null;
      },
    ),
  );
  app.use(staticFiles(join(here, '../browser')));
  app.use(async (request, response, next) => {
    const rendered = await engine.handle(request, context);
    return rendered ? writeResponseToNodeResponse(rendered, response) : next();
  });
  return app;
}

async function compose(): Promise<{ app: Express; dependencies: Dependencies }> {
  const config = readConfig(process.env);
  const dependencies = createDependencies(config, join(projectRoot(), 'api/database/migrations'));
  await prepareMarket(dependencies);
  return { app: createApplication(dependencies), dependencies };
}

/** Used by the Angular builder and its dev server. Nothing is opened before the first request. */
let composed: ReturnType<typeof composeForDevelopment> | undefined;
async function composeForDevelopment() {
  const parts = await compose();
  await startBackground(parts.dependencies);
  return parts;
}
export const reqHandler = createNodeRequestHandler(async (request, response, next) => {
  composed ??= composeForDevelopment();
  (await composed).app(request as Parameters<Express>[0], response as Parameters<Express>[1], next);
});

/** Finishes the requests under way, then folds the write-ahead log into the file. */
function stopCleanly(server: Server, dependencies: Dependencies, background: { stop(): Promise<void> }): void {
  let stopping = false;
  const stop = (signal: string) => {
    if (stopping) return;
    stopping = true;
    console.log(`${signal}: finishing requests…`);
    const impatient = setTimeout(() => server.closeAllConnections(), 8000);
    server.close(() => {
      clearTimeout(impatient);
      void background.stop().finally(() => {
        dependencies.database.close();
        process.exit(0);
      });
    });
    server.closeIdleConnections();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}

async function main(): Promise<void> {
  const { app, dependencies } = await compose();
  const { config } = dependencies;
  const background = await startBackground(dependencies);
  const server = createServer({ requestTimeout: 30_000, headersTimeout: 10_000, keepAliveTimeout: 5000 }, app);
  server.on('error', (error: NodeJS.ErrnoException) => {
    console.error(error.code === 'EADDRINUSE' ? `Port ${config.port} is taken. Set PORT to another one.` : error.message);
    process.exit(1);
  });
  server.listen(config.port, () => {
    console.log(`Sealyard is at ${config.publicUrl}`);
    for (const line of background.announcements) console.log(line);
  });
  stopCleanly(server, dependencies, background);
}

if (isMainModule(import.meta.url)) {
  main().catch((error: unknown) => {
    if (error instanceof WrongConfiguration) console.error(`This configuration cannot be used:\n${error.message}`);
    else if (error instanceof NewerDatabase) console.error(error.message);
    else console.error(error);
    process.exit(1);
  });
}
