/** What just happened, on the page that it led to. */
const NOTICES: Record<string, string> = {
  'signed-out': 'You are signed out.',
  password: 'Your password is changed, and you were signed out everywhere. Sign in with the new one.',
  invitation: 'Your password is set. Sign in with it.',
  first: 'Your account is made. Sign in with it.',
};

export function Notice({ name }: { name: string | undefined }) {
  const text = name && Object.hasOwn(NOTICES, name) ? NOTICES[name] : null;
  if (!text) return null;
  return (
    <p role="status" className="mt-4 max-w-prose border-l-3 border-water-4 pl-3">
      {text}
    </p>
  );
}
