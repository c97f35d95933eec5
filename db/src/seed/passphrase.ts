/** Words of the trade and the weather, short and easy to type; sixty-four of them, six bits each. */
const WORDS =
  "amber anvil apron basin birch bolt brick brisk canvas cedar chalk cinder clamp cobalt copper crane damper dawn ferry flint forge gable gauge glove granite harbor hatch hinge kettle ladder lantern lever linen maple meadow mortar nickel north oak otter pebble pillar plume prairie quarry quilt rafter river rivet saddle sleet slate spruce tallow thatch timber tundra valley velvet walnut willow winter wrench yarrow".split(
    " ",
  );

/** A pass phrase for a demo account: five words, thirty bits. For the demo on this machine only. */
export function makePassphrase(random: (bytes: number) => Uint8Array): string {
  return [...random(5)].map((byte) => WORDS[byte % WORDS.length] ?? "").join(" ");
}
