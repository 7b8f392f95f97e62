import { readFileSync } from 'node:fs';
import http from 'node:http';
import https from 'node:https';
import { createApp } from './app';
import { readConfig } from './config';
import { openDeps } from './open-deps';
import { runEntry } from './run-entry';
import { sweepUploads } from './services/sweep-uploads';
import { makeStorage } from './storage/make-storage';

/** A photo of 15 MB at 10 kB/s, the worst link that a rig has, still arrives. Headers keep their own, shorter limit. */
const slowestUploadMs = 30 * 60_000;

/** Requests that are running get this long to end before the process leaves. */
const patienceMs = 5_000;

runEntry(async () => {
  const config = readConfig(process.env);
  const deps = await openDeps(config);
  const swept = await sweepUploads(makeStorage(config, deps.ids), deps.clock());
  if (swept > 0) deps.log.info({ files: swept }, 'half received files swept');
  const app = createApp(deps);
  const server = config.tls
    ? https.createServer({ cert: readFileSync(config.tls.cert), key: readFileSync(config.tls.key) }, app)
    : http.createServer(app);
  server.requestTimeout = slowestUploadMs;

  let leaving = false;
  const leave = (why: string) => {
    if (leaving) return;
    leaving = true;
    deps.log.info({ why }, 'stopping');
    server.close(() => void deps.dataSource.destroy().finally(() => process.exit(0)));
    server.closeIdleConnections();
    setTimeout(() => process.exit(0), patienceMs).unref();
  };
  process.once('SIGTERM', () => leave('SIGTERM'));
  process.once('SIGINT', () => leave('SIGINT'));
  process.once('disconnect', () => leave('the process that started this one has gone'));

  server.once('error', (error) => {
    const taken = 'code' in error && error.code === 'EADDRINUSE';
    process.stderr.write(`${taken ? `Port ${config.port} is taken; set PORT to another.` : error.message}\n`);
    process.exit(1);
  });
  server.listen(config.port, config.host, () => {
    deps.log.info({ host: config.host, port: config.port }, 'listening');
    process.send?.('listening');
  });
});
