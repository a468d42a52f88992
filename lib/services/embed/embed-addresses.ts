import 'server-only';
import { THEME_CHOICES } from '@/lib/charts/tokens';

const PARTS = ['', '/chart.svg', '/data.json'];
const QUERIES = ['', ...THEME_CHOICES.map((theme) => `?theme=${theme}`)];

/** Every address under which a cache may hold an embed: newest and each version, each part, each theme. */
export function embedAddresses(origin: string, id: string, versions: readonly number[]): string[] {
  const names = [id, ...versions.map((number) => `${id}@${number}`)];
  return names.flatMap((name) =>
    PARTS.flatMap((part) => QUERIES.map((query) => `${origin}/embed/${name}${part}${query}`)),
  );
}
