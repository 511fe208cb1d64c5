import type { ChartConfiguration } from 'chart.js';
import type { BarPicture } from './chartPicture.ts';
import { stillChart } from './curveChart.ts';
import { withStrength, type Inks } from './readInks.ts';

/** Sideways bars as Chart.js wants them; bars below zero are hollow, so that the sign survives a grey printer. */
export function barChart(picture: BarPicture, inks: Inks): ChartConfiguration {
  const font = { family: inks.font, size: 12 };
  const colour = inks.of.probability;
  const made: ChartConfiguration<'bar', number[], string[]> = {
    type: 'bar',
    data: {
      labels: picture.bars.map(({ label }) => wrapped(label, LABEL_LETTERS)),
      datasets: [
        {
          data: picture.bars.map(({ value }) => value),
          backgroundColor: picture.bars.map(({ value }) => withStrength(colour, value < 0 ? 0 : 0.75)),
          borderColor: colour,
          borderWidth: 1.5,
          borderSkipped: false,
          barThickness: 14,
        },
      ],
    },
    options: {
      ...stillChart,
      parsing: undefined,
      normalized: undefined,
      events: [],
      indexAxis: 'y',
      layout: { padding: { top: 4, right: 14 } },
      scales: {
        x: {
          min: picture.from,
          max: picture.to,
          border: { color: inks.text },
          grid: { color: inks.grid },
          title: { display: true, text: picture.axisTitle, color: inks.text, font },
          ticks: { color: inks.text, font, maxTicksLimit: 7 },
        },
        y: {
          border: { color: inks.text },
          grid: { display: false },
          ticks: { color: inks.of.plain, font, autoSkip: false },
        },
      },
    },
  };
  return made as ChartConfiguration;
}

const LABEL_LETTERS = 26;

/** A text cut into lines of at most so many letters between words. */
export function wrapped(text: string, letters: number): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.length - 1;
    if (last >= 0 && lines[last].length + 1 + word.length <= letters) lines[last] += ` ${word}`;
    else lines.push(word);
  }
  return lines;
}
