import { PassThrough } from "node:stream";
import { createReadableStreamFromReadable } from "@react-router/node";
import { isbot } from "isbot";
import { renderToPipeableStream } from "react-dom/server";
import {
  type EntryContext,
  type HandleErrorFunction,
  isRouteErrorResponse,
  type RouterContextProvider,
  ServerRouter,
} from "react-router";
import { describeError, log } from "~/utils/http-log.server";
import { NonceProvider } from "~/utils/http-nonce";
import { requestFactsContext } from "~/utils/request-context";

export const streamTimeout = 10_000;

export default function handleRequest(
  request: Request,
  status: number,
  headers: Headers,
  routerContext: EntryContext,
  context: RouterContextProvider,
): Promise<Response> | Response {
  headers.set("Content-Type", "text/html; charset=utf-8");
  if (request.method === "HEAD") return new Response(null, { status, headers });
  const { id, nonce } = context.get(requestFactsContext);
  const whole = isbot(request.headers.get("User-Agent"));

  return new Promise((resolve, reject) => {
    let answered = false;
    const answer = () => {
      answered = true;
      const body = new PassThrough({
        final: (done) => {
          clearTimeout(timer);
          done();
        },
      });
      resolve(new Response(createReadableStreamFromReadable(body), { status, headers }));
      pipe(body);
    };
    const { pipe, abort } = renderToPipeableStream(
      <NonceProvider value={nonce}>
        <ServerRouter context={routerContext} url={request.url} nonce={nonce} />
      </NonceProvider>,
      {
        nonce,
        [whole ? "onAllReady" : "onShellReady"]: answer,
        onShellError: reject,
        onError(error) {
          status = 500;
          // Before the shell is out the same error comes again through handleError.
          if (answered) log.error({ requestId: id, error: describeError(error) }, "rendering failed");
        },
      },
    );
    const timer = setTimeout(abort, streamTimeout + 1000);
  });
}

/** What no guard has turned into an answer: faults in rendering and in the framework. */
export const handleError: HandleErrorFunction = (error, { request, context }) => {
  if (request.signal.aborted || isRouteErrorResponse(error)) return;
  const { id } = (context as RouterContextProvider).get(requestFactsContext);
  log.error({ requestId: id, method: request.method, error: describeError(error) }, "request failed");
};
