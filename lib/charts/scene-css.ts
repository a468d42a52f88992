import { ROLE_STYLES } from './scene-styles';
import { TOKENS, type ThemeChoice, type TokenName } from './tokens';

type Colour = (token: TokenName) => string;

/** In forced colours only the reader's own two inks are left: lines and shapes must say all of it. */
const FORCED = [
  '@media (forced-colors:active){',
  '.s-paper,.s-land,.s-water-1,.s-water-2,.s-water-3,.s-bar-hollow,.s-weight-half,.s-weight-hollow,.s-weight-dashed{fill:Canvas}',
  '.s-bar-filled,.s-weight,.s-weight-half-fill,.s-tick,.s-side,.s-estimate,.s-untested{fill:CanvasText}',
  '.s-edge,.s-inner-edge,.s-whisker,.s-calm-whisker,.s-shore,.s-bar-filled,.s-bar-hollow,.s-lead-line,',
  '.s-weight-half,.s-weight-hollow,.s-weight-dashed,.s-hatch-line{stroke:CanvasText}',
  '}',
].join('');

/** Rules of the picture with colours as variables: what the app's stylesheet holds. */
export function sceneRulesWithVariables(): string {
  return colours((token) => `var(--${token})`) + SHAPES + FORCED;
}

/**
 * Rules of the picture for a document of its own: by day, by night or as the reader's setting says. On paper it
 * is always day.
 */
export function sceneRules(theme: ThemeChoice): string {
  const day = colours((token) => TOKENS[token].light);
  const night = colours((token) => TOKENS[token].night);
  if (theme === 'light') return day + SHAPES + FORCED;
  if (theme === 'night') return night + SHAPES + FORCED;
  return `${day}@media screen and (prefers-color-scheme:dark){${night}}${SHAPES}${FORCED}`;
}

const ROLES = Object.entries(ROLE_STYLES);

/** One rule per role: its fill and stroke. */
function colours(colour: Colour): string {
  const ink = (token: TokenName | 'none') => (token === 'none' ? 'none' : colour(token));
  const rules = ROLES.flatMap(([role, { fill, stroke }]) => {
    const parts = [
      ...(fill === 'hatch' ? [] : [`fill:${ink(fill)}`]),
      ...(stroke ? [`stroke:${ink(stroke)}`] : []),
    ];
    return parts.length > 0 ? [`.s-${role}{${parts.join(';')}}`] : [];
  });
  return `${rules.join('')}.s-hatch-line{stroke:${colour('caution')}}.s-paper{fill:${colour('paper')}}`;
}

/** What does not change with the theme: widths, dashes, sizes. */
const SHAPES = `${ROLES.filter(([, style]) => style.rest)
  .map(([role, style]) => `.s-${role}{${style.rest}}`)
  .join('')}.s-hatch-line{stroke-width:1.6}`;
