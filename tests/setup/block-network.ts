import net from 'node:net';

const loopback = new Set(['127.0.0.1', '::1', 'localhost']);

type Connect = (this: net.Socket, ...values: unknown[]) => net.Socket;
const prototype = net.Socket.prototype as unknown as { connect: Connect };
const { connect } = prototype;

/** Tests may talk to this machine only: a connection to another host is a defect, and fails loudly. */
prototype.connect = function (...values) {
  const first: unknown = Array.isArray(values[0]) ? (values[0] as unknown[])[0] : values[0];
  const options = typeof first === 'object' && first !== null ? (first as { host?: string; path?: string }) : {};
  const host = options.path ? 'localhost' : (options.host ?? 'localhost');
  if (!loopback.has(host)) throw new Error(`A test tried to reach ${host}; tests may reach loopback only.`);
  return connect.apply(this, values);
};
