import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Request, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/**
 * One line a request, with the id that an error answer shows. The pattern of the route stands for its address: query strings, ids and
 * tokens of links do not reach the log, and neither do addresses and names of devices.
 */
export function requestLog(logger: Logger): RequestHandler {
  const summary = (req: IncomingMessage, res: ServerResponse, { responseTime }: { responseTime: number }) => ({
    method: req.method,
    route: routePattern(req as Request),
    status: res.statusCode,
    ms: responseTime,
  });
  return pinoHttp<Request>({
    logger,
    genReqId: () => randomUUID(),
    quietReqLogger: true,
    quietResLogger: true,
    // the library's own picture of a request has its whole address and headers
    serializers: { req: () => undefined, res: () => undefined },
    customLogLevel: (req, res, error) => {
      if (error !== undefined || res.statusCode >= 500) return 'error';
      return req.originalUrl.startsWith('/api/') ? 'info' : 'debug';
    },
    customSuccessMessage: () => 'answered',
    customErrorMessage: () => 'failed',
    customSuccessObject: summary,
    customErrorObject: (req, res, _error, value: { responseTime: number }) => summary(req, res, value),
  });
}

function routePattern(req: Request): string {
  const route = req.route as { readonly path?: unknown } | undefined;
  return typeof route?.path === 'string' ? route.path : 'none';
}
