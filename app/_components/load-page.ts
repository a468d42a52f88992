/** Loads a whole new page: nothing that the old one held may outlive a change of who is signed in. */
export function loadPage(path: string): void {
  window.location.assign(new URL(path, window.location.origin));
}
