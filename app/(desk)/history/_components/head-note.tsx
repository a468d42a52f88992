/** The last entry's number and hash: who keeps it elsewhere can later prove that nothing was cut or changed. */
export function HeadNote({ head }: { head: { seq: number; hash: string } | null }) {
  if (!head) return null;
  return (
    <section aria-labelledby="head" className="mb-6 max-w-[76ch] border-l-3 border-water-4 pl-4">
      <h2 id="head" className="section-heading">
        The head of the history now
      </h2>
      <p>
        <code className="break-all select-all">
          {head.seq}:{head.hash}
        </code>
      </p>
      <p className="text-13 text-soft">
        Each entry carries the hash of the one before. Keep this line somewhere outside this machine:{' '}
        <code>npm run record:verify -- --head SEQ:HASH</code>, with it in the place of SEQ:HASH, then proves
        that no entry up to it was changed, added or cut off since.
      </p>
    </section>
  );
}
