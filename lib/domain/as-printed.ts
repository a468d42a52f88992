import type { LineKind } from './sheet';

/** The key of a sheet that claims nothing and gives a release as it was printed. */
export const AS_PRINTED = 'as-printed';

/** The lines of such a sheet: there is no chart, since a chart shows uncertainty. */
export const AS_PRINTED_KINDS = ['headline', 'body', 'caveat'] as const satisfies readonly LineKind[];

export function isAsPrinted({ claimKey }: { claimKey: string }): boolean {
  return claimKey === AS_PRINTED;
}

/** The hours in which one editor alone may release such a sheet, by the clocks of the desk; the database knows them too. */
export const NIGHT = { from: '22:00', to: '06:00' } as const;
