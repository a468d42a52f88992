import type { HouseStyle } from './house-style';

/** How one house style prints, or says aloud, in one language. */
export type Voice = {
  style: HouseStyle;
  language: keyof HouseStyle['messages'];
  locale: string;
  isSpoken: boolean;
};

export function voiceOf(style: HouseStyle, language: Voice['language'], isSpoken = false): Voice {
  return { style, language, locale: style.locales[language], isSpoken };
}

/** American habits of a language, or those of the rest of the world. */
export function habitOf(locale: string): 'US' | 'GB' {
  return locale.endsWith('-US') ? 'US' : 'GB';
}
