import { acceptInvitation } from '@/server/acts/acceptInvitation';
import { signedIn } from '@/server/http/endpoint';

export const POST = signedIn('POST /api/invitations/[token]/accept', async (call) =>
  call.create(
    (context) => acceptInvitation(context, call.params.token),
    (joined) => `/api/workshops/${joined.id}`,
  ),
);
