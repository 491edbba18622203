import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import { readHealth, readOpenApi } from '@shared/contracts/system';
import { readCatalogue } from '@shared/contracts/bench';
import { catalogueRoutes } from './catalogue/catalogue-routes';
import { companyRoutes } from './companies/company-routes';
import { sessionRoutes } from './companies/session-routes';
import { type Dependencies } from './dependencies';
import { createAuthentication } from './http/authenticate';
import { mountRoutes, numberRequest } from './http/mount';
import { describeApi } from './http/openapi';
import { type Route, serveAnyone } from './http/serve';
import { priceRoutes } from './pricing/price-routes';
import { quoteRoutes } from './quotes/quote-routes';
import { orderRoutes } from './orders/order-routes';
import { receivableRoutes } from './receivables/receivable-routes';

/** Every route of the API; a test holds them against the list of endpoints. */
export const routes: Route[] = [
  serveAnyone(readHealth, () => ({ status: 'ok' as const })),
  serveAnyone(readOpenApi, (_actor, _input, { config }) => describeApi(config.publicUrl)),
  serveAnyone(readCatalogue, (_actor, _input, { catalogue }) => catalogue()),
  ...sessionRoutes,
  ...companyRoutes,
  ...catalogueRoutes,
  ...priceRoutes,
  ...quoteRoutes,
  ...orderRoutes,
  ...receivableRoutes,
];

/** The API as an Express application that does not listen. */
export function createApi(dependencies: Dependencies): Express {
  const { config, stores, clock, log } = dependencies;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.set('query parser', 'simple');
  app.use(numberRequest);
  app.use(
    pinoHttp({
      logger: log,
      genReqId: (_request, response) => String(response.getHeader('X-Request-Id')),
      // Paths and numbers alone: query strings, headers and bodies may hold names and secrets.
      serializers: {
        req: (request: { id: string; method: string; url: string }) => ({
          id: request.id,
          method: request.method,
          path: request.url.split('?')[0],
        }),
        res: (response: { statusCode: number }) => ({ status: response.statusCode }),
      },
      customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'debug'),
    }),
  );
  app.use(
    helmet({
      contentSecurityPolicy: {
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'", "'unsafe-inline'"],
          scriptSrcAttr: ["'unsafe-inline'"],
          styleSrc: ["'self'", "'unsafe-inline'"],
          imgSrc: ["'self'", 'data:'],
          fontSrc: ["'self'"],
          connectSrc: ["'self'"],
          objectSrc: ["'none'"],
          frameAncestors: ["'none'"],
          upgradeInsecureRequests: config.production ? [] : null,
        },
      },
      strictTransportSecurity: config.production,
    }),
  );
  app.use(compression());
  app.use(cookieParser());
  const authentication = createAuthentication({ config, clock, findMember: (sessionId) => stores.people.memberOf(sessionId, clock()) });
  mountRoutes(app, routes, authentication, dependencies);
  return app;
}
