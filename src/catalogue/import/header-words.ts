import { type Field, QUANTITY } from "./fields.js";
import { readUnit, type Unit } from "./units.js";

/** What a header cell may mean, by its words alone. */
export interface HeaderWords {
  /** The header as the list writes it, on one line. */
  readonly header: string;
  /** Fields it may stand for; figures decide between several. Empty for a column that is not read. */
  readonly meanings: readonly Field[];
  /** The unit written in it; null for none. */
  readonly unit: Unit | null;
}

const own = Object.keys(QUANTITY) as Field[];
const OWN_NAMES = new Map(own.map((name) => [name.toLowerCase(), name]));

/** Words of the trade, compact (small letters and digits only), by what they mean. Source: common practice of US, British and European tables. */
const WORDS: readonly (readonly [Field | readonly Field[], string])[] = [
  [
    "designation",
    "designation shape name profile profil profile perfil profilo size sectionname shapename sectiondesignation sectionsize label " +
      "bezeichnung beam member serialsize nomenclature wshape wsection steelshape querschnittsname type mark item profilbezeichnung",
  ],
  [
    "weightPlf",
    "weight wt mass plf g p weightperfoot weightperft weightperlength wtperft wtft wtperfoot massperm masspermetre masspermeter weightpermetre weightpermeter poundsperfoot lbsperfoot weightperlinearfoot massperlength massperunitlength massperunit " +
      "massperlengthunit unitweight unitmass linearweight linearmass nominalweight nominalwt nominalmass gewicht masse poids peso m massaperm " +
      "weightg massg massm metergewicht metregewicht eigengewicht kgm lbft lbsft lbperft kgperm masselineique massa weightw",
  ],
  [
    "areaIn2",
    "area crosssection crosssectionarea crosssectionalarea xsectarea sectionarea sectionalarea areaofsection areaa querschnitt flache flaeche " +
      "querschnittsflache querschnittsflaeche aire surface superficie f grossarea steelarea areacrosssection xarea csa",
  ],
  [
    "depthIn",
    "d h depth height overalldepth overallheight totaldepth depthofsection sectiondepth beamdepth depthd heighth depthh hohe hoehe hauteur altura altezza " +
      "profilhohe profilhoehe actualdepth",
  ],
  [
    "flangeWidthIn",
    "b bf width flangewidth breadth widthofsection sectionwidth flangebreadth flangewidthbf widthbf widthb bff breite flanschbreite largeur ancho " +
      "larghezza widthofflange actualwidth flgwidth flgw flangew bflange widthflange",
  ],
  [
    "webThicknessIn",
    "tw webthickness web thicknessweb thicknessofweb webthk webtw webthicknesstw thicknesstw steg stegdicke ame epaisseurame epaisseurdelame espesoralma " +
      "spessoreanima t1 webt webthick tweb thkweb",
  ],
  [
    "flangeThicknessIn",
    "tf flangethickness flange thicknessflange thicknessofflange flangethk flangetf flangethicknesstf thicknesstf flansch flanschdicke semelle " +
      "epaisseursemelle epaisseurdelasemelle espesorala spessoreala t2 flanget flangethick flgthickness flgthick flgthk flgt tflange thkflange meanflangethickness averageflangethickness",
  ],
  [["webThicknessIn", "sectionModulusXIn3", "plasticModulusXIn3", "sectionModulusYIn3", "plasticModulusYIn3"], "s"],
  [["flangeThicknessIn", "webThicknessIn"], "t"],
  [["flangeThicknessIn"], "e"],
  [["designation", "areaIn2"], "section"],
  [["areaIn2", "webThicknessIn"], "a"],
  ["kDesignIn", "k kdes kdesign designk kdesdecimal"],
  [
    "filletRadiusIn",
    "r1 rootradius filletradius fillet root ausrundung ausrundungsradius rayon radiusfillet radiusroot radius radiusr rootradiusr",
  ],
  [["filletRadiusIn", "radiusXIn", "radiusYIn"], "r"],
  [
    "torsionJIn4",
    "j it jt torsionconstant torsionalconstant torsionj torsionalconstantj torsionconstantj stvenant stvenantconstant torsioninertia torsionalinertia torsionstragheitsmoment itor",
  ],
  ["warpingCwIn6", "cw iw iω cω warping warpingconstant warpingconstantcw warpingconstanth wolbwiderstand wolbmoment warpingcw"],
  ["flangeSlenderness", "bf2tf b2tf b2t flangeslenderness"],
  ["webSlenderness", "htw webslenderness"],
  ["yieldStressKsi", "fy yield yieldstress yieldstrength yieldpoint re reh streckgrenze yieldfy"],
  ["yearBuilt", "year yearbuilt built yearofconstruction baujahr builtin yearrolled yearinstalled"],
  [
    "quantity",
    "qty quantity pcs pieces count onhand quantityonhand qtyonhand stuck stueck stk anzahl menge nombre cantidad numberofpieces noofpieces numberonhand available",
  ],
  [
    "usableLengthFt",
    "usablelength usable length usablelen len lange laenge longueur longitud nutzlange nutzlaenge lengthusable piecelength brauchbarelange",
  ],
  ["pricePerLb", "price priceperlb priceperpound preis prix precio unitprice cost costperlb priceperkg pricepert priceperton"],
  ["place", "place location yard bay rack lagerort lagerplatz platz where storage stored"],
  [
    "flangeLossIn",
    "flangeloss lossflange lossofflange flangesectionloss flangethicknessloss lossflangethickness lossofthicknessflange flangelossofthickness verlustflansch flanschverlust abrostungflansch flgloss",
  ],
  [
    "webLossIn",
    "webloss lossweb lossofweb websectionloss webthicknessloss losswebthickness lossofthicknessweb weblossofthickness verluststeg stegverlust abrostungsteg",
  ],
];
/** A note serves as the place where the list has no place. */
export const NOTE_WORDS = new Set("note notes remark remarks comment comments bemerkung bemerkungen anmerkung remarque nota".split(" "));

const BY_WORD = new Map<string, readonly Field[]>();
for (const [fields, words] of WORDS) {
  for (const word of words.split(" ")) BY_WORD.set(word, typeof fields === "string" ? [fields] : fields);
}

/** Characters beyond which a cell is no header. */
const LONGEST = 120;

type Pair = readonly [strong: Field, weak: Field];
const INERTIA: Pair = ["inertiaXIn4", "inertiaYIn4"];
const ELASTIC: Pair = ["sectionModulusXIn3", "sectionModulusYIn3"];
const PLASTIC: Pair = ["plasticModulusXIn3", "plasticModulusYIn3"];
const GYRATION: Pair = ["radiusXIn", "radiusYIn"];
/**
 * Properties about an axis. In US tables S is elastic and Z plastic, in older British ones Z is elastic and S plastic, in European ones W is
 * either; a small i is a radius of gyration, and in a file of small letters an inertia. So each may mean several, and the figures decide.
 */
const ABOUT_AXIS: readonly (readonly [string, readonly Pair[]])[] = [
  ["i", [INERTIA, GYRATION]],
  ["j", [INERTIA]],
  [
    "inertia momentofinertia momentinertia moi secondmoment secondmomentofarea secondmomentarea areamomentofinertia tragheitsmoment traegheitsmoment flachentragheitsmoment momentdinertie momentodeinercia inertie",
    [INERTIA],
  ],
  ["s z w sectionmodulus modulus widerstandsmoment", [ELASTIC, PLASTIC]],
  [
    "wel sel ze zel we elasticmodulus elasticsectionmodulus sectionmoduluselastic elasticmodulussection modulofelastic elasticsectionmoduluss moduleelastique",
    [ELASTIC],
  ],
  [
    "wpl zpl zp wp spl plasticmodulus plasticsectionmodulus sectionmodulusplastic plasticmodulussection plasticsectionmodulusz moduleplastique",
    [PLASTIC],
  ],
  ["r rg radiusofgyration gyration gyrationradius tragheitsradius traegheitsradius rayondegiration", [GYRATION]],
];
/** Strong, weak, or open. In US tables x is the strong axis and y the weak one, in European ones y and z. */
const AXES: Readonly<Record<string, "strong" | "weak" | "open">> = {
  "": "open",
  x: "strong",
  xx: "strong",
  strong: "strong",
  major: "strong",
  max: "strong",
  y: "open",
  yy: "open",
  z: "weak",
  zz: "weak",
  weak: "weak",
  minor: "weak",
  min: "weak",
};

/**
 * Takes a header cell apart into words and unit.
 *
 * @param cell the header as the list writes it; may hold line breaks
 */
export function readHeader(cell: string): HeaderWords {
  const header = cell.replace(/[\s\u00a0]+/g, " ").trim();
  if (header.length > LONGEST) return { header: header.slice(0, LONGEST), meanings: [], unit: null };
  const named = OWN_NAMES.get(header.toLowerCase());
  if (named !== undefined) return { header, meanings: [named], unit: unitOfOwnName(named) };
  const whole = meaningsOf(header);
  const { name, unit } = splitUnit(header);
  if (whole.length > 0 && unit === null) return { header, meanings: whole, unit: null };
  // A header that is a unit and nothing else names its quantity where only one column can have it.
  const meanings = name === "" && unit !== null ? fieldOfUnit(unit) : meaningsOf(name);
  const fitting = unit === null ? meanings : meanings.filter((field) => QUANTITY[field] === unit.quantity);
  if (fitting.length > 0) return { header, meanings: fitting, unit };
  if (meanings.length > 0) return { header, meanings, unit: null };
  return { header, meanings: whole, unit: whole.length > 0 ? null : unit };
}

function fieldOfUnit({ quantity }: Unit): readonly Field[] {
  if (quantity === "weight") return ["weightPlf"];
  return quantity === "price" ? ["pricePerLb"] : [];
}

function unitOfOwnName(field: Field): Unit | null {
  const words: Readonly<Record<string, string>> = { usableLengthFt: "ft", yieldStressKsi: "ksi", pricePerLb: "money/lb", weightPlf: "plf" };
  const ending = /In(\d?)$/.exec(field);
  return readUnit(words[field] ?? (ending === null ? "" : `in${ending[1]}`));
}

/** The name and the unit of a header: in brackets, after a comma or a stroke, or as the last words. */
function splitUnit(header: string): { readonly name: string; readonly unit: Unit | null } {
  for (const bracket of header.matchAll(/[([{]([^()[\]{}]*)[)\]}]/g)) {
    const unit = readUnit(bracket[1]);
    if (unit !== null) return { name: `${header.slice(0, bracket.index)} ${header.slice(bracket.index + bracket[0].length)}`, unit };
  }
  for (let at = 0; at < header.length; at++) {
    if (!/[ ,/_\-–:;]/.test(header[at]) && at !== 0) continue;
    const rest = at === 0 ? header : header.slice(at + 1);
    const unit = readUnit(rest.replace(/^in /i, (word) => (/^in (?:in|mm|cm|ft|m|lb|kg|ksi|mpa)/i.test(rest) ? "" : word)));
    const name = header.slice(0, at);
    if (unit !== null && (at > 0 || unit.quantity === "weight" || unit.quantity === "price")) return { name, unit };
  }
  return { name: header, unit: null };
}

function compactName(name: string): string {
  return name
    .toLowerCase()
    .normalize("NFKD")
    .replace(/[^a-z0-9ωφ]/g, "");
}

/** Fields that a name without its unit may stand for. */
function meaningsOf(name: string): readonly Field[] {
  const word = compactName(name);
  if (word === "" || word.length > 60) return [];
  const direct = BY_WORD.get(word);
  if (word === "w") return ["weightPlf", "webThicknessIn", ...aboutAxis("w")];
  if (word === "z" || (direct === undefined && word !== "kdet")) {
    const about = aboutAxis(word);
    if (about.length > 0) return about;
  }
  if (direct !== undefined) return direct;
  // A long name with its symbol behind or before it: "Depth d", "tw web thickness".
  const parts = name.trim().split(/[ ,;:()=]+/);
  if (parts.length < 2) return NOTE_WORDS.has(word) ? ["place"] : [];
  const first = BY_WORD.get(compactName(parts[0]));
  const last = BY_WORD.get(compactName(parts[parts.length - 1]));
  const restOfFirst = BY_WORD.get(compactName(parts.slice(1).join("")));
  const restOfLast = BY_WORD.get(compactName(parts.slice(0, -1).join("")));
  if (restOfLast !== undefined && last?.some((field) => restOfLast.includes(field))) return restOfLast;
  if (restOfFirst !== undefined && first?.some((field) => restOfFirst.includes(field))) return restOfFirst;
  return longName(parts);
}

/** A property in words with its symbol: "Moment of inertia Ix", "Plastic modulus Zx", "Ix (strong axis)". */
function longName(parts: readonly string[]): readonly Field[] {
  for (const at of [1, parts.length - 1]) {
    const before = aboutAxis(compactName(parts.slice(0, at).join("")));
    const behind = aboutAxis(compactName(parts.slice(at).join("")));
    const both = before.filter((field) => behind.includes(field));
    if (both.length > 0) return both;
  }
  return [];
}

function aboutAxis(compact: string): readonly Field[] {
  const word = compact.replace(/(?:about|the|axis|achse|axe|eje|asse)/g, "");
  for (const [names, pairs] of ABOUT_AXIS) {
    for (const kind of names.split(" ")) {
      const axisBehind = word.startsWith(kind) ? AXES[word.slice(kind.length)] : undefined;
      const axisBefore = kind.length > 2 && word.endsWith(kind) ? AXES[word.slice(0, word.length - kind.length)] : undefined;
      const axis = axisBehind ?? axisBefore;
      if (axis === undefined) continue;
      if (kind === "j" && axis === "open" && word === "j") continue;
      if (axis === "strong") return pairs.map(([strong]) => strong);
      if (axis === "weak") return pairs.map(([, weak]) => weak);
      return pairs.flat();
    }
  }
  return [];
}
