import {
  createServer,
  type IncomingMessage,
  type RequestListener,
  type Server,
  type ServerResponse,
} from 'node:http';

/** How long a connection may take for what it sends, milliseconds. Answers may take as long as they need. */
export interface ServerTimes {
  headersMs: number;
  /** For everything but files. */
  bodyMs: number;
  /** For a file: a picture over a village's slow network takes a quarter of an hour. */
  uploadMs: number;
  /** How often connections are looked at. */
  checkEveryMs: number;
}

export const SERVER_TIMES: ServerTimes = {
  headersMs: 20_000,
  bodyMs: 60_000,
  uploadMs: 30 * 60_000,
  checkEveryMs: 5_000,
};

/** A server that nobody can hold up by sending a request letter by letter. */
export function openServer(app: RequestListener, times: ServerTimes = SERVER_TIMES): Server {
  const options = {
    headersTimeout: times.headersMs,
    requestTimeout: times.uploadMs,
    connectionsCheckingInterval: times.checkEveryMs,
  };
  return createServer(options, (request, response) => {
    endSlowBody(request, response, times.bodyMs);
    app(request, response);
  });
}

/** What was answered already, and what brings no file, has so long to be sent whole. */
function endSlowBody(request: IncomingMessage, response: ServerResponse, bodyMs: number): void {
  const endLater = () => {
    const timer = setTimeout(() => {
      if (!request.complete) request.destroy();
    }, bodyMs).unref();
    request.once('close', () => {
      clearTimeout(timer);
    });
  };
  const bringsFile = request.headers['content-type']?.startsWith('multipart/form-data') ?? false;
  if (!bringsFile) endLater();
  else response.once('finish', endLater);
}
