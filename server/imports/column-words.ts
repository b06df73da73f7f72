import type { ImportOptions } from '../../shared/schemas/imports.ts';

type ImportField = keyof ImportOptions['columns'];

/**
 * What columns are called that fill a field, the likeliest first: words in small letters without
 * accents, in English, German, French, Spanish, Italian, Dutch and Portuguese.
 */
export const COLUMN_WORDS: Readonly<Record<ImportField, readonly string[]>> = {
  reference: [
    'reference', 'building reference', 'building ref', 'ref', 'building id', 'bldg id', 'reference no',
    'reference number', 'asset id', 'gebaude id', 'gebaeude id', 'objekt id', 'objectid', 'id', 'local id',
    'gml id', 'uuid', 'fid', 'code', 'nummer', 'kennung', 'referencia', 'referencia catastral', 'refcat',
    'reference cadastrale', 'riferimento', 'codice', 'referentie', 'kenmerk', 'identificatie', 'toid', 'uprn', 'egid', 'number',
  ],
  name: ['name', 'building name', 'bldg name', 'bezeichnung', 'gebaudename', 'gebaeudename', 'nom', 'nombre', 'nome', 'naam', 'title', 'denominacion'],
  address: ['address', 'full address', 'street address', 'postal address', 'street', 'adresse', 'anschrift', 'strasse', 'strase', 'direccion', 'indirizzo', 'adres', 'straat', 'endereco', 'morada', 'calle', 'via', 'rue'],
  use: ['use', 'building use', 'current use', 'usage', 'land use', 'occupancy', 'nutzung', 'gebaudenutzung', 'funktion', 'uso', 'uso actual', 'destinazione', 'destinazione d uso', 'gebruik', 'gebruiksdoel', 'utilizacao', 'building', 'function', 'type'],
  storeys: ['storeys', 'stories', 'storey', 'number of storeys', 'number of floors', 'number of floors above ground', 'floors', 'no of floors', 'floor count', 'levels', 'building levels', 'storeys above ground', 'geschosse', 'geschosszahl', 'anzahl geschosse', 'etagen', 'etages', 'nombre d etages', 'nb etages', 'niveaux', 'plantas', 'num plantas', 'numero plantas', 'piani', 'numero piani', 'bouwlagen', 'aantal bouwlagen', 'verdiepingen', 'pisos'],
  eavesHeight: ['eaves height', 'height eaves', 'eaves', 'height to eaves', 'building height', 'height', 'height m', 'measured height', 'relh2', 'traufhohe', 'traufhoehe', 'hohe', 'hoehe', 'gebaudehohe', 'hauteur', 'altura', 'altezza', 'hoogte', 'goothoogte'],
  groundLevel: ['ground level', 'ground', 'gl', 'ground elevation', 'ground height', 'terrain level', 'base level', 'absh min', 'gelande', 'gelandehohe', 'gelaendehoehe', 'gok', 'niveau du sol', 'cota terreno', 'cota', 'quota terreno', 'maaiveld', 'maaiveldhoogte', 'elevation'],
  foundingLevel: ['founding level', 'foundation level', 'foundation elevation', 'level of foundation', 'formation level', 'toe level', 'grundungssohle', 'gruendungssohle', 'fundamentsohle', 'niveau de fondation', 'cota cimentacion', 'quota fondazione', 'funderingsniveau', 'aanlegniveau'],
  foundation: ['foundation', 'foundation kind', 'foundation type', 'foundations', 'type of foundation', 'grundung', 'gruendung', 'fundament', 'fundation', 'fondation', 'fondations', 'cimentacion', 'fondazione', 'fundering', 'funderingstype', 'fundacao'],
  construction: ['construction', 'construction type', 'construction material', 'structure', 'structure type', 'structural system', 'material', 'building material', 'bauweise', 'bauart', 'konstruktion', 'materiau', 'estructura', 'struttura', 'materiale', 'materiaal', 'constructie', 'estrutura'],
  eOverG: ['e g', 'e over g', 'eoverg', 'e by g', 'e g ratio', 'stiffness ratio'],
  poisson: ['poisson', 'poisson ratio', 'poissons ratio', 'nu', 'querdehnzahl'],
  listedGrade: ['listed grade', 'listing', 'listed', 'grade', 'listing grade', 'listed building grade', 'heritage', 'heritage grade', 'heritage status', 'protected', 'protection', 'denkmal', 'denkmalschutz', 'classement', 'proteccion', 'tutela', 'vincolo', 'monument', 'monumentstatus'],
  condition: ['condition', 'building condition', 'state', 'condition of construction', 'structural condition', 'zustand', 'bauzustand', 'etat', 'estado', 'estado conservacion', 'stato', 'stato conservazione', 'staat', 'conditie', 'conservation'],
  inspected: ['inspected', 'inspection', 'inspected inside', 'surveyed', 'begangen', 'besichtigt', 'inspecte', 'inspeccionado', 'ispezionato', 'geinspecteerd'],
  structureScore: ['structure score', 'structural sensitivity score', 'score structure'],
  structureReason: ['structure score because', 'structure reason', 'reason for structure score'],
  featuresScore: ['features score', 'feature score', 'finishes score', 'score features'],
  featuresReason: ['features score because', 'features reason', 'reason for features score'],
}; // prettier-ignore
