/** Stored with every plan; raised whenever the same inputs may give another answer. */
export const RULES_VERSION = '1.1.0';
