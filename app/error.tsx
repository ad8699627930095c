'use client';

import { ErrorBody } from '@/components/ui/ErrorBody';

export default function PageError({ error, retry }: { readonly error: unknown; readonly retry: () => void }) {
  return <ErrorBody error={error} retry={retry} />;
}
