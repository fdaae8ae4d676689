import NextAuth from "next-auth";
import { authOptions } from "@/lib/auth/auth-options";

type Handler = (request: Request, context: { params: Promise<{ nextauth: string[] }> }) => Promise<Response>;

/** Signing in and out. next-auth guards its own writes with a token that only its own pages hold. */
const handler: Handler = (request, context) => (NextAuth(authOptions()) as Handler)(request, context);

export { handler as GET, handler as POST };
