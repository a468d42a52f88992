import type { Barred, Ladder } from '../ladder';

/** Per verdict, what German headlines and chart titles stand on, strongest first. */
export const DE_LADDER: Ladder = {
  holds: [
    ...['vorsprung', ' vor ', 'häufiger', 'mehr zuspruch', 'mehr antworten', 'zuwachs', 'rückgang'],
    ...['verschoben', 'über der', 'unter der'],
  ],
  fragile: ['höher', 'niedriger', 'günstiger für', 'über der', 'unter der'],
  'does-not-hold': [
    ...['gleicher wert', 'derselbe wert', 'demselben wert', 'könnte', 'zu nah', 'wenig veränderung'],
    'genau an der',
  ],
  'cannot-be-tested': [
    ...['ohne anerkannte fehlerspanne', 'lässt sich', 'nicht vergleichbar', 'nicht veröffentlicht'],
    ...['fehlen', 'fehlt', 'zu wenige', 'nicht sagt'],
  ],
};

/** What German may not say below a verdict. Common practice, no source; ties: as in English. */
export const DE_BARRED: Barred = {
  never: [
    ...[
      'Kopf-an-Kopf(?:-Rennen)?',
      'gleichauf',
      'Gleichstand',
      'Patt',
      'unentschieden',
      'hauchdünn',
      'zu knapp',
    ],
    ...['stürzt ab', 'Absturz', 'bricht ein', 'Einbruch', 'Höhenflug', 'Aufwind', 'Rückenwind', 'Momentum'],
    ...['Erdrutsch\\p{L}*', 'schießt', 'unverändert', 'stabil', 'stagniert'],
    '(?:Umfragen?|Zahlen|Werte) (?:zeigen|zeigt|beweisen|beweist|belegen|belegt|bestätigen|bestätigt)',
    '(?:Prozent|%) (?:Vorsprung|Abstand)',
  ],
  needsHolds: [
    ...[
      'führ(?:t|en)',
      'Führung',
      'vorne?',
      'Vorsprung',
      'sieht [^,.:;]+ vor',
      'Favorit(?:in|en)?',
      'Mehrheit',
    ],
    ...['häufiger', 'mehr Zuspruch', 'mehr Antworten', '(?:Zuwachs|Rückgang) (?:für|beim)'],
    ...[
      'der (?:Zuwachs|Rückgang)',
      'legt zu',
      'verliert',
      'gewinnt',
      'steigt',
      'fällt',
      'sinkt',
      'verschoben',
    ],
  ],
  needsFragile: [
    ...['(?:über|unter) der \\S+-(?:Hürde|Marke)', 'höher(?:e[rnms]?)?', 'niedriger(?:e[rnms]?)?'],
    ...['günstiger für', 'mehr als die Hälfte', 'weniger als die Hälfte'],
  ],
  needsTestPassed: ['signifikant(?:e[rnms]?)?'],
};
