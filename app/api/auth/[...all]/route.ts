import { handleAuth } from '@/server/http/authRoute';

export const GET = handleAuth;
export const POST = handleAuth;
