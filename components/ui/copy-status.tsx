/** Says aloud and shows that something was copied, saved or refused. Keep it mounted; change the message. */
export function CopyStatus({ message, isFault = false }: { message: string | null; isFault?: boolean }) {
  return (
    <p role="status" aria-live="polite" className={isFault ? 'copy-status copy-status-fault' : 'copy-status'}>
      {message ?? ''}
    </p>
  );
}
