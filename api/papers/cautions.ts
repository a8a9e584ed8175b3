/** What stands on every paper that goes to a bench. */
export const CAUTIONS: readonly string[] = [
  'Figures are shop aids. Make the first piece from scrap or a coupon and measure it.',
  "Use approved data and the manufacturer's repair manual.",
  'Work on aircraft is released only by appropriately licensed or authorised people under local rules.',
  "Keep hands clear of clamp and leaf; gloves off near moving clamps where the shop's rules say so. Deburr edges. Wear eye protection.",
];
