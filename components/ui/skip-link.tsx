/** First stop of the keyboard: past the navigation, to the page. The target needs `id="main"` and tabIndex -1. */
export function SkipLink({ href = '#main', label = 'Skip to the page' }: { href?: string; label?: string }) {
  return (
    <a href={href} className="skip-link no-print">
      {label}
    </a>
  );
}
