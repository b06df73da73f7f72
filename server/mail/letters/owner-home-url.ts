/** Where an owner finds their buildings of a scheme, for links in mail. */
export function ownerHomeUrl(publicUrl: string, schemeId: string): string {
  return new URL(`/schemes/${schemeId}/home`, publicUrl).href;
}
