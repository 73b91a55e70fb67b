/** Species that can form of some elements and that a set may not hold; from memory. Not part of library.ts. */
import table from "./further-products.json";

/** One of them, with the conditions under which its share can reach some thousandths. */
export interface FurtherProduct {
  /** Formula, of a condensed species with its phase. */
  readonly species: string;
  /** The element that is misjudged without it. */
  readonly element: string;
  /** K. */
  readonly from: number;
  readonly to: number;
  readonly when: "always" | "lean" | "rich" | "sooting" | "halogen";
}

export const furtherProducts: readonly FurtherProduct[] = table.species as readonly FurtherProduct[];
