import { createServer } from 'node:net';
import { Obstacle } from './say.mjs';

/** Whether nothing listens on this port of the loopback address. */
export function portIsFree(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', (error) => {
      if (error.code === 'EADDRINUSE') resolve(false);
      else if (error.code === 'EACCES')
        reject(
          new Obstacle(`Port ${port} needs more rights than this user has. Choose one above 1023: PORT=3001 npm start`),
        );
      else reject(error);
    });
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** A port that is free now, chosen by the system. */
export function freePort() {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}

/** The web port: PORT, or 3000. Throws an obstacle that names the way out if it cannot be had. */
export async function webPort(text = process.env.PORT) {
  if (text !== undefined && text !== '' && !/^\d{1,5}$/.test(text))
    throw new Obstacle(`PORT is "${text}". It must be a whole number from 1 to 65535.`);
  const port = Number(text || 3000);
  if (port < 1 || port > 65535) throw new Obstacle(`PORT is ${port}. It must be from 1 to 65535.`);
  if (await portIsFree(port)) return port;
  const other = port < 65535 ? port + 1 : port - 1;
  throw new Obstacle(
    `Port ${port} on 127.0.0.1 is in use by another program. Choose another one:\n\n    PORT=${other} npm start`,
  );
}
