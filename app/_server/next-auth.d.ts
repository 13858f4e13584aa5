import 'next-auth';
import 'next-auth/jwt';

declare module 'next-auth' {
  interface Session {
    /** Row of the table `sessions`; the person is read through it on every request. */
    sessionId: string | null;
  }
  interface User {
    sessionId: string;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    sessionId?: string;
  }
}
