import { sceneRulesWithVariables } from './scene-css';
import { TOKENS, type Theme, type ThemeChoice } from './tokens';

const SERIF = 'Charter,"Iowan Old Style",Georgia,"Times New Roman",serif';
const SANS = 'system-ui,-apple-system,"Segoe UI",Roboto,"Helvetica Neue",Arial,sans-serif';

/** The one stylesheet of a public page: the reader's own fonts, day and night, paper, forced colours, 320 px. */
export function embedStyle(theme: ThemeChoice): string {
  return colourRules(theme) + PAGE + sceneRulesWithVariables() + LATE;
}

function colourRules(theme: ThemeChoice): string {
  if (theme !== 'auto') return `${rootOf(theme)}@media print{${rootOf('light')}}`;
  return `${rootOf('light')}@media screen and (prefers-color-scheme:dark){${rootOf('night')}}`;
}

function rootOf(theme: Theme): string {
  const colours = Object.entries(TOKENS).map(([name, token]) => `--${name}:${token[theme]}`);
  return `:root{color-scheme:${theme === 'night' ? 'dark' : 'light'};${colours.join(';')}}`;
}

const PAGE = [
  '*{box-sizing:border-box}',
  `body{margin:0;background:var(--paper);color:var(--ink);font:15px/1.45 ${SANS};overflow-wrap:break-word}`,
  'main{max-width:696px;padding:20px 22px}',
  `h1{margin:0 0 5px;font:500 26px/1.2 ${SERIF};letter-spacing:-.01em;text-wrap:balance}`,
  'p{margin:0 0 4px}.sub{color:var(--soft)}',
  'figure{margin:16px 0 18px}',
  '.sounding{display:block;width:100%;height:auto;font-variant-numeric:tabular-nums lining-nums}',
  '.narrow{display:none}',
  'figcaption,.foot{font-size:13px;color:var(--soft)}figcaption{margin-top:6px}',
  'table{width:100%;border-collapse:collapse;font-variant-numeric:tabular-nums lining-nums}',
  'caption{padding-bottom:2px;text-align:left;font-size:13px;font-weight:600;color:var(--soft)}',
  'th,td{padding:5px 0 5px 14px;border-bottom:1px solid var(--rule);text-align:right;font-weight:400;white-space:nowrap}',
  'th:first-child{padding-left:0;text-align:left;white-space:normal}',
  'thead th{font-size:13px;color:var(--soft);border-color:var(--soft);vertical-align:bottom}',
  'td:nth-child(2){font-weight:600}.rest>*{color:var(--soft);font-weight:400!important}',
  '.opt{display:grid;grid-template-columns:minmax(0,9em) minmax(0,300px);align-items:center;gap:12px}',
  `.cav{margin-top:16px;font:16px/1.45 ${SERIF};max-width:70ch}`,
  '.foot{display:flex;flex-wrap:wrap;gap:2px 20px;justify-content:space-between;margin:14px 0 0}',
  '.foot span{min-width:0}a{color:inherit;display:inline-block;min-height:24px}',
  'a:focus-visible{outline:2px solid var(--water-5);outline-offset:2px}',
].join('');

const LATE = [
  '@media (max-width:539px){main{padding:14px}h1{font-size:22px}.narrow{display:block}.wide{display:none}',
  '.opt{display:block}.opt .sounding{margin-top:3px}}',
  '@media print{body{background:#fff}main{padding:0}figure,tr{break-inside:avoid}}',
].join('');
