// @vitest-environment happy-dom
import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from '@/components/ui/button';
import { CopyStatus } from '@/components/ui/copy-status';
import { DataTable } from '@/components/ui/data-table';
import { Dialog } from '@/components/ui/dialog';
import { PageTitle } from '@/components/ui/page-title';
import { Rail } from '@/components/ui/rail';
import { WordDiff } from '@/components/ui/word-diff';

afterEach(cleanup);

describe('a button', () => {
  it('takes no second press while the work runs, and keeps its focus', async () => {
    const press = vi.fn();
    const view = render(<Button onClick={press}>Clear for publication</Button>);
    await userEvent.click(screen.getByRole('button'));
    view.rerender(
      <Button onClick={press} pending pendingLabel="Clearing…">
        Clear for publication
      </Button>,
    );
    const button = screen.getByRole('button', { name: 'Clearing…' });
    await userEvent.click(button);
    expect(press).toHaveBeenCalledTimes(1);
    expect(document.activeElement).toBe(button);
    expect(button.getAttribute('aria-disabled')).toBe('true');
  });

  it('does not submit a form unless told to', () => {
    render(<Button>Send back</Button>);
    expect(screen.getByRole('button').getAttribute('type')).toBe('button');
  });
});

describe('a table', () => {
  it('has caption, column heads and row heads, and scrolls within a named region', () => {
    render(
      <DataTable
        caption="Releases, newest first"
        rows={[{ id: '1', pollster: 'Kelmouth Research', n: 1012 }]}
        rowKey={(row) => row.id}
        columns={[
          { key: 'pollster', head: 'Pollster', cell: (row) => row.pollster, rowHead: true },
          { key: 'n', head: 'Interviews', cell: (row) => row.n, numeric: true },
        ]}
      />,
    );
    const region = screen.getByRole('region', { name: 'Releases, newest first' });
    expect(region.tabIndex).toBe(0);
    expect(within(region).getByRole('rowheader').textContent).toBe('Kelmouth Research');
    expect(
      within(region)
        .getAllByRole('columnheader')
        .map((head) => head.textContent),
    ).toEqual(['Pollster', 'Interviews']);
    expect(within(region).getByRole('cell').className).toBe('numeric');
  });

  it('says so where it has no row', () => {
    const columns = [{ key: 'a', head: 'Pollster', cell: () => null }];
    render(<DataTable caption="Releases" rows={[]} rowKey={String} columns={columns} empty="None yet" />);
    expect(screen.getByRole('cell').textContent).toBe('None yet');
  });
});

describe('the rail', () => {
  const items = [
    { href: '/today', label: 'Today', count: 3 },
    { href: '/releases', label: 'Releases' },
  ];

  it('marks the current section in the list and names it on the menu', () => {
    const { container } = render(<Rail items={items} currentHref="/releases" />);
    const current = container.querySelectorAll('[aria-current="page"]');
    expect([...current].map((link) => link.textContent)).toEqual(['Releases', 'Releases']);
    expect(container.querySelector('summary')?.textContent).toBe('Sections, now in Releases');
  });

  it('counts aloud what waits', () => {
    render(<Rail items={items} currentHref={null} />);
    expect(screen.getAllByRole('link', { name: /Today\s*3 waiting/ }).length).toBeGreaterThan(0);
  });
});

describe('a dialog', () => {
  function Page() {
    const [isOpen, setOpen] = useState(false);
    return (
      <>
        <Button onClick={() => setOpen(true)}>Pull</Button>
        <Dialog isOpen={isOpen} onClose={() => setOpen(false)} title="Pull this line?">
          <p>Say why.</p>
        </Dialog>
      </>
    );
  }

  it('is named by its title and gives focus back to what opened it', async () => {
    render(<Page />);
    expect(screen.queryByText('Say why.')).toBeNull();
    await userEvent.click(screen.getByRole('button', { name: 'Pull' }));
    const dialog = screen.getByRole<HTMLDialogElement>('dialog', { name: 'Pull this line?' });
    expect(dialog.open).toBe(true);
    await userEvent.click(within(dialog).getByRole('button', { name: 'Close' }));
    expect(dialog.open).toBe(false);
    expect(document.activeElement).toBe(screen.getByRole('button', { name: 'Pull' }));
  });
});

describe('what is read aloud', () => {
  it('names removed and added words', () => {
    render(
      <WordDiff
        parts={[
          { text: 'well ahead', change: 'removed' },
          { text: 'ahead', change: 'added' },
        ]}
      />,
    );
    expect(document.querySelector('del')?.textContent).toBe('(removed: well ahead)');
    expect(document.querySelector('ins')?.textContent).toBe('(added: ahead)');
  });

  it('announces a copy in a region that was there before', () => {
    const view = render(<CopyStatus message={null} />);
    const status = screen.getByRole('status');
    view.rerender(<CopyStatus message="Copied as plain text." />);
    expect(screen.getByRole('status')).toBe(status);
    expect(status.textContent).toBe('Copied as plain text.');
  });

  it('says where one is and gives the page one heading', () => {
    render(
      <PageTitle
        title="Kelmouth Research: Alder 49, Brook 41"
        crumbs={[{ label: 'Releases', href: '/releases' }, { label: 'Averil Coast governor' }]}
      />,
    );
    const where = screen.getByRole('navigation', { name: 'Where you are' });
    expect(within(where).getByRole('link').getAttribute('href')).toBe('/releases');
    expect(screen.getByRole('heading', { level: 1 }).textContent).toContain('Alder 49');
  });
});
