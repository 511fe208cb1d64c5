import { centralValue } from '../../engine/project/centralValue.ts';
import type { Model } from '../../engine/project/model.ts';
import { thicknessNumber } from '../../engine/project/thicknessAt.ts';
import { enteredNumberText, significantNumberText } from '../words/numberText.ts';

/** The section for who cannot see it: layers from the top, water, fill, points. */
export function sectionInWords(model: Model): string {
  const layers = model.layers.map(({ name, thickness }) => {
    const central = centralValue(thicknessNumber(thickness));
    const size =
      thickness.kind === 'even'
        ? `${significantNumberText(central)} m`
        : thickness.x
            .map(
              (x, i) =>
                `${significantNumberText(central * thickness.thickness[i])} m at x ${enteredNumberText(x)} m`,
            )
            .join(', ');
    return `${name}, ${size}`;
  });
  const lifts = model.lifts.map(
    ({ name, thickness }) => `${name}, ${significantNumberText(centralValue(thickness))} m`,
  );
  const points = model.points.map(
    ({ name, x, fixed }) => `${name} at x ${enteredNumberText(x)} m${fixed ? ', fixed' : ''}`,
  );
  const water = significantNumberText(centralValue(model.water.depth));
  return [
    `Cross-section. Layers from the top: ${layers.join('; ')}.`,
    `Water level ${water} m below ground.`,
    lifts.length > 0 ? `Fill: ${lifts.join('; ')}.` : 'No fill.',
    points.length > 0 ? `Points: ${points.join('; ')}.` : 'No points.',
  ].join(' ');
}
