import type { ChartConfiguration, ChartDataset, ScaleOptionsByType } from 'chart.js';
import type { AnnotationOptions } from 'chartjs-plugin-annotation';
import type { Axis, ChartPicture, Mark, Series } from './chartPicture.ts';
import { withStrength, type Inks } from './readInks.ts';

/** A picture of curves as Chart.js wants it; a band becomes two lines with the space between them filled. */
export function curveChart(picture: ChartPicture, inks: Inks): ChartConfiguration {
  const made: ChartConfiguration<'line'> = {
    type: 'line',
    data: { datasets: picture.series.flatMap((series) => datasets(series, inks)) },
    options: {
      ...stillChart,
      events: [],
      scales: { x: scale(picture.x, inks, 'x'), y: scale(picture.y, inks, 'y') },
      plugins: {
        annotation: {
          clip: false,
          annotations: picture.marks.map((mark) => annotation(mark, inks, picture)),
        },
      },
    },
  };
  return made as ChartConfiguration;
}

/** What all charts share: no motion of their own, no pop-ups, the size of their frame. */
export const stillChart = {
  animation: false,
  parsing: false,
  normalized: true,
  responsive: true,
  maintainAspectRatio: false,
  layout: { padding: { top: 22, right: 14 } },
} as const;

function datasets(series: Series, inks: Inks): ChartDataset<'line'>[] {
  const colour = inks.of[series.ink];
  const stepped = series.stepped ? ('before' as const) : false;
  const bare = { pointRadius: 0, pointHitRadius: 0, tension: 0, stepped, segment: {} };
  if (series.kind === 'line') {
    return [
      {
        ...bare,
        label: series.name,
        data: series.x.map((x, i) => ({ x, y: series.y[i] })),
        borderColor: colour,
        borderWidth: series.width,
        borderDash: series.dashed ? [4, 4] : [],
        fill: false,
      },
    ];
  }
  const edge = {
    ...bare,
    borderWidth: 0,
    borderColor: colour,
    backgroundColor: withStrength(colour, series.strength),
  };
  return [
    {
      ...edge,
      label: `${series.name} (low)`,
      data: series.x.map((x, i) => ({ x, y: series.low[i] })),
      fill: false,
    },
    {
      ...edge,
      label: `${series.name} (high)`,
      data: series.x.map((x, i) => ({ x, y: series.high[i] })),
      fill: '-1',
    },
  ];
}

function scale(axis: Axis, inks: Inks, which: 'x' | 'y') {
  return {
    type: 'linear' as const,
    min: axis.from,
    max: axis.to,
    reverse: axis.reversed,
    border: { color: inks.text },
    grid: { color: inks.grid, tickColor: inks.grid, lineWidth: 1 },
    title: { display: true, text: axis.title, color: inks.text, font: { family: inks.font, size: 12 } },
    ticks: {
      color: inks.text,
      font: { family: inks.font, size: 12 },
      maxTicksLimit: which === 'x' ? 7 : 6,
      maxRotation: 0,
      autoSkipPadding: 12,
      includeBounds: false,
      callback: (value: string | number) => axis.tickText(Number(value)),
    },
  } satisfies DeepPartialScale;
}

type DeepPartialScale = { [K in keyof ScaleOptionsByType<'linear'>]?: unknown };

function annotation(mark: Mark, inks: Inks, picture: ChartPicture): AnnotationOptions<'line'> {
  const colour = inks.of[mark.ink];
  const axis = picture[mark.axis];
  const late = (mark.value - axis.from) / (axis.to - axis.from) > 0.6;
  const upright = mark.axis === 'x';
  return {
    type: 'line',
    scaleID: mark.axis,
    value: mark.value,
    borderColor: colour,
    borderWidth: 1.5,
    borderDash: mark.dashed ? [6, 4] : [],
    label: {
      display: mark.label !== '',
      content: mark.label,
      position: upright ? (axis.reversed ? 'end' : 'start') : 'end',
      xAdjust: 0,
      yAdjust: upright ? -20 : -10,
      textAlign: late ? 'end' : 'start',
      backgroundColor: inks.paper,
      color: colour,
      padding: { x: 3, y: 1 },
      borderRadius: 0,
      font: { family: inks.font, size: 12, weight: 'normal' },
    },
  };
}
