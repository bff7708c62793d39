import type { Server } from "node:http";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { createRequestHandler } from "@react-router/express";
import compression from "compression";
import express, { type ErrorRequestHandler, type Express } from "express";
import type { ServerBuild } from "react-router";
import { startMailWorker } from "~/services/mail/start-mail-worker.server";
import { readEnv } from "~/utils/env";
import { describeError, log } from "~/utils/http-log.server";
import { ADDRESS_HEADER } from "~/utils/request-address";

declare global {
  /** Read by the health route: no new work should come here. */
  var __cotterpinDraining: boolean | undefined;
}

/** Long enough for clients and proxies to hear that this process goes, short enough not to be noticed. */
const noticeTime = 400;
/** Requests still running after this are cut. The starter gives the whole process 8 s. */
const drainLimit = 6_000;
const closeLimit = 1_000;

const folder = import.meta.dirname;
let leaving = false;

function makeApplication(build: ServerBuild, publicUrl: string | undefined): Express {
  const application = express();
  application.disable("x-powered-by");
  // One proxy stands before us when there is a public address: what it says of scheme, host and client counts.
  if (publicUrl) application.set("trust proxy", 1);
  application.use((request, response, next) => {
    request.headers[ADDRESS_HEADER.toLowerCase()] = request.ip;
    if (globalThis.__cotterpinDraining) response.setHeader("Connection", "close");
    next();
  });
  application.use(compression());
  serveFiles(application);
  // The framework asks too, and knows the public address from here alone; root middleware compares it exactly.
  const allowedActionOrigins = publicUrl ? [new URL(publicUrl).host] : undefined;
  application.all(
    "/{*path}",
    createRequestHandler({ build: { ...build, allowedActionOrigins }, mode: "production" }),
  );
  application.use(answerError);
  return application;
}

function serveFiles(application: Express): void {
  const client = path.join(folder, "client");
  const shared = { index: false, redirect: false, setHeaders: addFileHeaders } as const;
  // The names of these files change with their content.
  application.use(
    "/assets",
    express.static(path.join(client, "assets"), { ...shared, immutable: true, maxAge: "1y" }),
  );
  application.use("/assets", (_request, response) => {
    response
      .status(404)
      .type("text/plain")
      .set("Cache-Control", "no-store")
      .send("This file is not here any more: load the page again.");
  });
  application.use(express.static(client, { ...shared, maxAge: "1h" }));
}

function addFileHeaders(response: { setHeader(name: string, value: string): void }): void {
  response.setHeader("X-Content-Type-Options", "nosniff");
  response.setHeader("Cross-Origin-Resource-Policy", "same-origin");
}

const answerError: ErrorRequestHandler = (error, _request, response, next) => {
  const status = Number(error?.status) >= 400 && Number(error?.status) < 500 ? Number(error.status) : 500;
  if (status === 500) log.error({ error: describeError(error) }, "request failed");
  if (response.headersSent) return next(error);
  response
    .status(status)
    .type("text/plain")
    .set("X-Content-Type-Options", "nosniff")
    .set("Cache-Control", "no-store");
  response.send(
    status === 500
      ? "Something went wrong here: try again in a moment."
      : "This address or request cannot be read: check it.",
  );
};

function listen(application: Express, host: string, port: number): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = application.listen(port, host, (error?: Error) =>
      error ? reject(error) : resolve(server),
    );
    server.headersTimeout = 15_000;
    server.requestTimeout = 120_000;
    server.keepAliveTimeout = 65_000;
  });
}

/** Says no to new work, lets running requests and a mail that is being sent end, closes the database's connections. */
async function leave(server: Server, mail: ReturnType<typeof startMailWorker>): Promise<void> {
  globalThis.__cotterpinDraining = true;
  log.info("draining");
  const mailStopped = mail.stop();
  await wait(noticeTime);
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  await Promise.race([Promise.all([closed, mailStopped]), wait(drainLimit)]);
  server.closeAllConnections();
  const { __cotterpinClose } = globalThis as { __cotterpinClose?: () => Promise<void> };
  await Promise.race([__cotterpinClose?.(), wait(closeLimit)]);
  log.info("stopped");
}

function wait(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds).unref());
}

async function main(): Promise<void> {
  const env = readEnv();
  const build: ServerBuild = await import(pathToFileURL(path.join(folder, "server/index.js")).href);
  const server = await listen(makeApplication(build, env.publicUrl), env.host, env.port);
  const mail = startMailWorker();
  const stop = (code: number) => {
    if (leaving) return;
    leaving = true;
    leave(server, mail).finally(() => process.exit(code));
  };
  for (const signal of ["SIGTERM", "SIGINT"] as const) process.on(signal, () => stop(0));
  // The starter is gone: nobody else would stop us.
  process.on("disconnect", () => stop(0));
  process.on("unhandledRejection", (reason) =>
    log.error({ error: describeError(reason) }, "unhandled rejection"),
  );
  process.on("uncaughtException", (error) => {
    log.fatal({ error: describeError(error) }, "uncaught exception");
    stop(1);
  });
  process.send?.("ready");
}

main().catch((error: NodeJS.ErrnoException) => {
  const taken = error.code === "EADDRINUSE";
  console.error(
    taken
      ? "The port is taken by another program: set PORT to a free one."
      : `The application did not start: ${error.message}`,
  );
  process.exit(1);
});
