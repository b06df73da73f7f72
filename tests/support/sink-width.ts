/** Layers from the top down, each with the level of its base. */
export type SinkLayers = readonly { readonly base: number; readonly K: number }[];

/** How wide a trough is, by name as in the method, or by layers. */
export type SinkRule =
  'constant' | 'clay' | 'oreilly-new-clay' | 'oreilly-new-sand' | { readonly layers: SinkLayers };

/** Ground and founding level of a wall. */
export type SinkLevels = { readonly ground: number; readonly founding: number };

/** i at a founding level over an axis, written out from the method. */
export function sinkWidth(
  rule: SinkRule,
  K: number,
  { ground, founding }: SinkLevels,
  axis: number,
): number {
  const z0 = ground - axis;
  const z = ground - founding;
  const h = z0 - z;
  if (typeof rule === 'object') {
    return rule.layers.reduce((width, layer, k) => {
      const top = Math.min(founding, k === 0 ? Infinity : (rule.layers[k - 1]?.base ?? Infinity));
      return width + layer.K * Math.max(0, top - Math.max(axis, layer.base));
    }, 0);
  }
  switch (rule) {
    case 'constant':
      return K * h;
    case 'clay':
      return ((K - (0.325 * z) / z0) / (1 - z / z0)) * h;
    case 'oreilly-new-clay':
      return 0.43 * z0 + 1.1 - 0.325 * z;
    case 'oreilly-new-sand':
      return ((0.28 * z0 - 0.1) * h) / z0;
  }
}

/** f, the height over the focus: the axis, or 0.175/0.325 of z0 below it. */
export function sinkFocus(
  focus: 'axis' | 'deep',
  { ground, founding }: SinkLevels,
  axis: number,
): number {
  return founding - axis + (focus === 'deep' ? (0.175 / 0.325) * (ground - axis) : 0);
}
