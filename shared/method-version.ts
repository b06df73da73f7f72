/**
 * The version of the method, kept with every result. It changes whenever a change could move a
 * figure.
 *
 * Units: none. Valid: semantic version. Source: [own].
 */
export const METHOD_VERSION = '1.1.0';
