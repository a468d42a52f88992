// @vitest-environment happy-dom
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ChangeList } from '@/app/(desk)/house-style/_components/change-list';
import { ChooseVersions } from '@/app/(desk)/house-style/_components/choose-versions';

afterEach(cleanup);

describe('comparing two versions of house style', () => {
  it('offers every version on both sides, with the two that are shown chosen, in a form with an address', () => {
    const versions = [3, 2, 1].map((number) => ({ id: `v${number}`, number }));
    const { container } = render(<ChooseVersions versions={versions} from="v2" to="v3" />);
    const [from, to] = screen.getAllByRole<HTMLSelectElement>('combobox');
    expect([from?.value, to?.value]).toEqual(['v2', 'v3']);
    expect(from?.options).toHaveLength(3);
    const form = container.querySelector('form')!;
    expect([form.method, form.getAttribute('action')]).toEqual(['get', '/house-style/compare']);
  });

  it('names each decision and shows what was struck and what was put in', () => {
    const changes = [
      { path: 'style.percent', before: 'sign', after: 'per-cent' },
      { path: 'style.banned.es', before: [], after: ['empate técnico'] },
    ];
    const { container } = render(<ChangeList changes={changes} />);
    expect(screen.getByText('Percent')).toBeTruthy();
    expect(screen.getByText('Banned phrases, Spanish')).toBeTruthy();
    expect(container.querySelectorAll('ins').length).toBeGreaterThan(0);
    expect(container.textContent).toContain('empate técnico');
  });

  it('says so where nothing differs', () => {
    render(<ChangeList changes={[]} />);
    expect(screen.getByText('Nothing differs.')).toBeTruthy();
  });
});
