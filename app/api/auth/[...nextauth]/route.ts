import NextAuth from 'next-auth';
import { authOptions } from '@/app/_server/auth-options';

const handler = NextAuth(authOptions) as (request: Request, context: object) => Promise<Response>;

export { handler as GET, handler as POST };
