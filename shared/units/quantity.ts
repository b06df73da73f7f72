/**
 * A number that remembers its unit for the type checker: plain numbers may enter, but a quantity
 * of one unit is refused where another is wanted.
 *
 * Units: the tag itself. Valid: compile time only, nothing is stored. Source: [own].
 */
export type Quantity<Unit extends string> = number & { readonly unit?: Unit };

/**
 * Lengths, levels, chainages and settlements inside the core.
 *
 * Units: m. Valid: finite. Source: [own].
 */
export type Metres = Quantity<'m'>;

/**
 * Lengths as people read small movements.
 *
 * Units: mm. Valid: finite. Source: [own].
 */
export type Millimetres = Quantity<'mm'>;

/**
 * Strains, slopes, volume losses and other ratios inside the core.
 *
 * Units: m/m. Valid: finite. Source: [own].
 */
export type Ratio = Quantity<'m/m'>;

/**
 * Ratios as people read strains and volume losses.
 *
 * Units: %. Valid: finite. Source: [own].
 */
export type Percent = Quantity<'%'>;
