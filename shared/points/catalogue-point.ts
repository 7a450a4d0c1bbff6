/**
 * What the catalogue says of one point of measure. Kinds and tape errors, which the engine reckons with, are
 * in measures.ts: this is the prose, for people.
 */

/** Where on the body a point is looked for; `garment` points exist on cloth only. */
export const POINT_GROUPS = ['headAndNeck', 'torso', 'arm', 'leg', 'lengths', 'garment'] as const;
/** Where on the body a point is looked for. */
export type PointGroup = (typeof POINT_GROUPS)[number];

/** A person's own word for the fullest level of the upper torso. */
export type ChestWord = 'bust' | 'chest';

/**
 * One entry of the catalogue. `nameFrom` says whose term the name is: ISO 8559 (the 1989 list of body dimensions, as
 * tabled in the textbook *Anthropometry, Apparel Sizing and Design*, Table 4.1; the standard itself was not opened),
 * EN 13402-1 (its list of dimensions, as quoted by public summaries), or the trade's (*common practice*).
 * `howTo` is in our own words, *common practice*; `{bust}` in it stands for the person's word.
 */
export interface CataloguePoint {
  name: string;
  chestName?: string;
  shortName: string;
  shortChestName?: string;
  nameFrom: 'ISO 8559' | 'EN 13402-1' | 'trade';
  otherNames: readonly string[];
  howTo: string;
  group: PointGroup;
}

/** The entry of one side of a point that is taken left and right, its names and how-to derived from the middle one. */
export function oneSide(point: CataloguePoint, side: 'left' | 'right'): CataloguePoint {
  return {
    name: `${point.name}, ${side}`,
    shortName: `${point.shortName}, ${side}`,
    nameFrom: point.nameFrom,
    otherNames: point.otherNames.map((name) => `${side} ${name}`),
    howTo: `${point.howTo} This one is the ${side} side; take it where the two sides differ.`,
    group: point.group,
  };
}
