import net from 'node:net';
import { Failure } from './failure.mjs';
import { waitUntil } from './processes.mjs';

/** Whether a program can listen at this address now; the error's code where it cannot. */
export function tryToListen(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = net.createServer();
    server.once('error', (error) => resolve(error.code));
    server.listen({ port, host, exclusive: true }, () => {
      const taken = server.address().port;
      server.close(() => resolve(taken));
    });
  });
}

/** A free loopback port: the preferred one where it is free, else one that the system picks. */
export async function freePort(preferred = 0) {
  const first = preferred ? await tryToListen(preferred) : null;
  if (typeof first === 'number') return first;
  const picked = await tryToListen(0);
  if (typeof picked !== 'number')
    throw new Failure(`No port on 127.0.0.1 can be opened (${picked}).`, 'Look at the limits of this machine.');
  return picked;
}

/**
 * The port of the web server.
 *
 * @param {string | undefined} declared PORT as set by the person, who then gets that port or a message
 * @param {number} preferred tried first where nothing was declared
 * @param {number} patienceMs how long a taken port is waited for
 */
export async function webPort(declared, host, preferred, patienceMs = 0) {
  if (declared === undefined || declared === '') {
    const wish = await listenPatiently(preferred, host, patienceMs);
    if (typeof wish === 'number') return wish;
    const other = await tryToListen(0, host);
    if (typeof other === 'number') return other;
    throw new Failure(`Nothing can listen at ${host} (${other}).`, 'Set HOST to an address of this machine.');
  }
  const port = readPort(declared);
  if (port === null) throw new Failure(`PORT is "${declared}".`, 'Set it to a whole number from 1 to 65535.');
  const answer = await listenPatiently(port, host, patienceMs);
  if (answer === port) return port;
  if (answer === 'EADDRINUSE') {
    throw new Failure(
      `Port ${port} is taken by another program.`,
      'Stop that program, or set PORT to a free one (or to none).',
    );
  }
  if (answer === 'EACCES') {
    throw new Failure(`Port ${port} may only be opened by root.`, 'Set PORT to 1024 or above.');
  }
  throw new Failure(
    `Nothing can listen at ${host}:${port} (${answer}).`,
    'Set HOST to an address of this machine and PORT to a free port.',
  );
}

async function listenPatiently(port, host, patienceMs) {
  let answer = null;
  await waitUntil(
    async () => {
      answer = await tryToListen(port, host);
      return answer !== 'EADDRINUSE';
    },
    patienceMs,
    250,
  );
  return answer;
}

/** A port number from text, or null. */
export function readPort(text) {
  if (!/^\d{1,5}$/.test(text)) return null;
  const port = Number(text);
  return port >= 1 && port <= 65_535 ? port : null;
}

/** Whether something answers at this loopback port. */
export function answersAt(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const socket = net.connect({ port, host });
    socket.setTimeout(1_000, () => socket.destroy());
    socket.once('connect', () => {
      socket.destroy();
      resolve(true);
    });
    socket.once('error', () => resolve(false));
    socket.once('close', () => resolve(false));
  });
}
