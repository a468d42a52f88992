'use client';

import { ErrorPage } from '../_components/error-page';

export default function DoorError({ error, retry }: { error: unknown; retry: () => void }) {
  return <ErrorPage error={error} retry={retry} />;
}
