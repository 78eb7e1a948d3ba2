import type { SurveyField } from '../../../shared/surveys/types';

/**
 * How surveys head their columns, in the spellings of the trade (common practice), after `readHeading` has taken away
 * units, accents and punctuation. `station` and `x`, `y`, `n` mean different things in different company: see `matchHeadings`.
 */
const WORDS: Record<SurveyField, string> = {
  section: `section|section id|section no|section nr|section number|section name|section ref|cross section|crosssection|
    cross section id|cross section no|cross section number|cross section name|xs|xs id|xs no|xs name|xsec|xsection|xsect|id|
    profile|profile id|profile no|profile name|transect|querprofil|profil|profil nr|profilnr|profilname|profilnummer|
    querprofil nr|nom|nom du profil|nom profil|profil en travers|seccion|seccion transversal|perfil|nombre|nombre seccion|no perfil`,
  chainage: `chainage|ch|chain|chainage along reach|river chainage|section chainage|distance downstream|downstream distance|
    distance along reach|distance along river|reach distance|river distance|river km|river kilometre|km|
    kilometrierung|stationierung|fluss km|flusskm|gewasserstation|flusskilometer|pk|point kilometrique|pk m|
    abscisse curviligne|progresiva|cadenamiento|kilometraje|punto kilometrico`,
  offset: `offset|off|offset from left|offset from left bank|offset from lb|dist|distance|dist from left bank|
    distance from left bank|dist from lb|distance from lb|dist left bank|distance from left|lateral distance|lateral offset|
    cross distance|transverse distance|section offset|point offset|cross chainage|abstand|querabstand|distanz|
    abstand vom linken ufer|abstand linkes ufer|distance rive gauche|dist rive gauche|distance depuis rive gauche|
    abscisse|abscisse en travers|distance en travers|distancia|dist margen izquierda|distancia desde margen izquierda|
    distancia margen izquierda|abscisa|distancia transversal`,
  elevation: `elevation|elev|el|level|lvl|reduced level|rl|z|height|altitude|alt|ground level|gl|ground elevation|bed level|
    bed elevation|point level|point elevation|maod|hohe|hoehe|kote|gelandehohe|sohlhohe|cote|cote ngf|niveau|cota|elevacion|
    altura|nivel|altitud`,
  roughness: `roughness|manning|mannings|manning n|mannings n|n manning|n value|manning roughness|roughness n|
    manning coefficient|mannings coefficient|rauheit|rauigkeit|rauhigkeit|mannings wert|rugosite|n de manning|coef manning|
    rugosidad|coeficiente de manning`,
  bank: `bank|banks|bank mark|bank marks|bank marker|bank point|mark|marker|code|point code|feature code|ufer|uferpunkt|
    ufermarke|berge|berges|rive|margen|orilla|marca`,
  easting: `easting|east|eastings|e coord|x coord|coord x|x coordinate|rechtswert|ostwert|est|este|coordenada x|coordonnee x`,
  northing: `northing|north|northings|n coord|y coord|coord y|y coordinate|hochwert|nordwert|nord|norte|coordenada y|
    coordonnee y`,
};

export const HEADING_WORDS: ReadonlyMap<string, SurveyField> = new Map(
  Object.entries(WORDS).flatMap(([field, words]) =>
    words.split('|').map((word): [string, SurveyField] => [word.trim(), field as SurveyField]),
  ),
);

/** Names of the fields in sentences to the person. */
export const FIELD_NAMES: Record<SurveyField, string> = {
  section: 'section',
  chainage: 'chainage',
  offset: 'offset',
  elevation: 'elevation',
  roughness: "Manning's n",
  bank: 'bank mark',
  easting: 'easting',
  northing: 'northing',
};

export const LENGTH_FIELDS: readonly SurveyField[] = [
  'chainage',
  'offset',
  'elevation',
  'easting',
  'northing',
];
