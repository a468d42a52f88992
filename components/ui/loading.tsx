/** Lines of the coming page. The words are announced; the lines are for the eye. */
export function Skeleton({ lines = 4 }: { lines?: number }) {
  return (
    <div className="skeleton" aria-hidden="true">
      {Array.from({ length: lines }, (_, at) => (
        <span key={at} />
      ))}
    </div>
  );
}

export function Loading({ label = 'Loading…', lines }: { label?: string; lines?: number }) {
  return (
    <div role="status" className="loading">
      <p className="text-soft">{label}</p>
      <Skeleton lines={lines} />
    </div>
  );
}
