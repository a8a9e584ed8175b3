/**
 * Which leg of each starting section lies level, so that width and height of the formed part are the ones its sizes speak
 * of. A section that is not named here gets the engine's own choice.
 */
export const SECTION_SEATS: ReadonlyMap<string, number> = new Map([
  ['angle', 0],
  ['channel', 1],
  ['z', 0],
  ['hat', 0],
  ['lipped-channel', 2],
  ['j', 1],
  ['sloped-hat', 0],
  ['stepped-angle', 0],
]);
