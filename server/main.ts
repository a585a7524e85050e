/** Starts the server: configuration, database, app; ends it cleanly when asked. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { openDatabase } from '@drizzle/database';
import { createApp } from './app';
import { LiveLayouts } from './events/live-layouts';
import { readConfig, type Config } from './config';
import { createLogger } from './http/request-log';

/** Requests still running when the server is asked to end get this long. */
const LAST_REQUESTS_MS = 10_000;
const IDLE_EVERY_MS = 200;

function start(config: Config): void {
  const logger = createLogger(config.logLevel);
  const open = openDatabase(config.databaseUrl, {
    connections: config.databaseConnections,
    onConnectionLost: (error) => logger.warn({ err: error }, 'a database connection was lost'),
  });
  const live = new LiveLayouts(open, config.databaseUrl, logger);
  const server = createServer(createApp({ config, open, logger, live }));

  server.on('error', (error) => {
    console.error(`The server cannot listen on ${config.host}:${config.port}: ${error.message}.`);
    process.exit(1);
  });
  server.listen(config.port, config.host, () => {
    const { address, port, family } = server.address() as AddressInfo;
    const host = family === 'IPv6' ? `[${address}]` : address;
    const url = `http://${host}:${port}`;
    logger.info({ url }, 'listening');
    // Tells the program that started us, if it left a channel open, that the port is really ours.
    process.send?.({ listening: url });
  });

  const end = (signal: NodeJS.Signals): void => {
    logger.info({ signal }, 'ending');
    server.close(() => {
      void open.close().finally(() => process.exit(0));
    });
    void live.close();
    // one that was still being answered a moment ago is idle a moment later
    setInterval(() => server.closeIdleConnections(), IDLE_EVERY_MS).unref();
    setTimeout(() => server.closeAllConnections(), LAST_REQUESTS_MS).unref();
  };
  process.once('SIGTERM', end);
  process.once('SIGINT', end);
}

const read = readConfig(process.env);
if (read.ok) {
  start(read.config);
} else {
  console.error(read.sentence);
  process.exit(1);
}
