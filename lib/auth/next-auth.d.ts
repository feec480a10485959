import 'next-auth/jwt';

declare module 'next-auth/jwt' {
  interface JWT {
    /** The session's token as it stands in the cookie. */
    opaque?: string;
  }
}
