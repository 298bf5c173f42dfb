/**
 * Line colours that people with any colour vision tell apart, each above 3:1 against its ground; never used without a
 * dash pattern. Source: Okabe & Ito, Color Universal Design, 2002.
 */
const onLight = ['#0072B2', '#C4470A', '#00805C', '#A8497D', '#000000', '#7A5C00'] as const;
const onDark = ['#56B4E9', '#E69F00', '#2FC49A', '#DD8FBB', '#F0E442', '#D5D5DC'] as const;

const dashes: readonly (readonly number[])[] = [[], [7, 3], [2, 2], [9, 3, 2, 3], [1, 4], [12, 4]];

export interface LineStyle {
  readonly colour: string;
  readonly dash: readonly number[];
}

/** Style of the nth curve; beyond six the colours repeat with another dash. */
export function lineStyle(index: number, dark: boolean): LineStyle {
  const colours = dark ? onDark : onLight;
  const round = Math.floor(index / colours.length);
  return { colour: colours[index % colours.length], dash: dashes[(index + round) % dashes.length] };
}
