/** What a test looks for: a difference either way, one below 0, or one above 0. */
export type Alternative = 'two-sided' | 'less' | 'greater';
