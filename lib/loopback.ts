/** Whether a host name or address (as in `URL.hostname`) can only be reached from this machine. */
export function isLoopbackHost(hostname: string): boolean {
  const name = hostname.toLowerCase().replace(/^\[|\]$/g, '');
  return name === 'localhost' || name.endsWith('.localhost') || name === '::1' || /^127(\.\d{1,3}){3}$/.test(name);
}
