import type { Barred, Ladder } from '../ladder';

/** Per verdict, what French headlines and chart titles stand on, strongest first. */
export const FR_LADDER: Ladder = {
  holds: [
    ...['devant', 'avance', 'plus fréquente', 'davantage de', 'hausse', 'baisse', 's’est déplacé'],
    ...['au-dessus', 'au-dessous'],
  ],
  fragile: ['plus élevé', 'plus bas', 'penche davantage', 'au-dessus', 'au-dessous'],
  'does-not-hold': [...['même chiffre', 'pourrait', 'trop près', 'peu de changement', 'exactement sur']],
  'cannot-be-tested': [
    ...['sans marge d’erreur reconnue', 'ne peut pas', 'non comparable', 'non communiqué', 'omet'],
    ...['trop peu', 'ne dit pas'],
  ],
};

/** What French may not say below a verdict. Common practice, no source; ties: as in English. */
export const FR_BARRED: Barred = {
  never: [
    ...['à égalité', 'égalité (?:parfaite|statistique|technique)', 'coude[- ]à[- ]coude', 'ex æquo'],
    ...[
      'mouchoir de poche',
      'trop serrée?s?',
      's’envole(?:nt)?',
      's’effondre(?:nt)?',
      'dévisse(?:nt)?',
      'bondi(?:t|ssent)',
    ],
    ...['dynamique', 'élan', 'raz-de-marée', 'sans changement', 'inchangée?s?', 'stables?', 'stagne(?:nt)?'],
    '(?:sondages?|enquêtes?|chiffres) (?:montre(?:nt)?|prouve(?:nt)?|démontre(?:nt)?|confirme(?:nt)?)',
    '(?:pour cent|%) d’(?:avance|écart)',
  ],
  needsHolds: [
    ...[
      'devant',
      'en tête',
      'avance',
      'mène(?:nt)?',
      'domine(?:nt)?',
      'favori(?:te)?s?',
      'majorité',
      'majoritaires?',
    ],
    ...['plus fréquente?s?', 'davantage de (?:soutien|réponses)', 'en hausse', 'en baisse'],
    ...['(?:cette|la|état d’une|suggèrent une) (?:hausse|baisse)', '(?:hausse|baisse) (?:pour|du solde)'],
    ...['progresse(?:nt)?', 'recule(?:nt)?', 'gagne(?:nt)?', 'perd(?:ent)?', 'monte(?:nt)?', 'chute(?:nt)?'],
    ...['s’est déplacé', 'ce déplacement'],
  ],
  needsFragile: [
    ...['au-dessus', 'au-dessous', 'en dessous', 'plus élevée?s?', 'plus bas(?:se)?', 'penche davantage'],
    ...['plus de la moitié', 'moins de la moitié'],
  ],
  needsTestPassed: ['significati(?:f|fs|ve|ves|vement)'],
};
