import { describe, expect, test } from 'vitest';
import { guessColumns } from '../../../server/imports/guess-columns.ts';

function guessed(...names: string[]) {
  return guessColumns(names.map((name) => ({ name, filled: 1 })));
}

describe('guessColumns', () => {
  test.each([
    [['Building_Ref', 'EAVES_HT', 'eavesHeight', 'No. of storeys'], { reference: 'Building_Ref', eavesHeight: 'eavesHeight', storeys: 'No. of storeys' }],
    [['Gebäude-ID', 'Nutzung', 'Geschosse', 'Traufhöhe', 'Gründung', 'Denkmalschutz', 'Zustand'], { reference: 'Gebäude-ID', use: 'Nutzung', storeys: 'Geschosse', eavesHeight: 'Traufhöhe', foundation: 'Gründung', listedGrade: 'Denkmalschutz', condition: 'Zustand' }],
    [['referencia', 'dirección', 'uso', 'plantas', 'altura', 'cimentación', 'estado'], { reference: 'referencia', address: 'dirección', use: 'uso', storeys: 'plantas', eavesHeight: 'altura', foundation: 'cimentación', condition: 'estado' }],
    [['nom', 'adresse', 'étages', 'hauteur', 'matériau'], { name: 'nom', address: 'adresse', storeys: 'étages', eavesHeight: 'hauteur', construction: 'matériau' }],
    [['identificatie', 'gebruiksdoel', 'bouwlagen', 'maaiveld', 'fundering'], { reference: 'identificatie', use: 'gebruiksdoel', storeys: 'bouwlagen', groundLevel: 'maaiveld', foundation: 'fundering' }],
    [['name', 'material', 'Listed grade', 'founding_level'], { name: 'name', construction: 'material', listedGrade: 'Listed grade', foundingLevel: 'founding_level' }],
    [['filename', 'lowerCorner', 'xyz'], {}],
  ])('of %j', (names, columns) => {
    expect(guessed(...names)).toEqual(columns);
  }); // prettier-ignore

  test('leaves empty columns out and uses none twice', () => {
    const columns = [
      { name: 'reference', filled: 0 },
      { name: 'id', filled: 3 },
    ];
    expect(guessColumns(columns)).toEqual({ reference: 'id' });
  });
});
