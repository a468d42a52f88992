/** The name with its weight. */
export function Wordmark() {
  return (
    <span className="wordmark">
      <svg aria-hidden="true" viewBox="0 0 13 28" width="13" height="28">
        <path d="M6.5 0V12" fill="none" stroke="currentColor" strokeWidth="1.6" />
        <path d="M6.5 10C9.5 14 12 18 12 21.5A5.5 5.5 0 0 1 1 21.5C1 18 3.5 14 6.5 10Z" fill="currentColor" />
      </svg>
      Leadline
    </span>
  );
}
