import { useEffect, useRef } from 'react';
import uPlot from 'uplot';
import 'uplot/dist/uPlot.min.css';
import type { Reading } from '~/domain/reading/reading';
import { litresPerVolumeUnit, volumeUnitSigns, type VolumeUnit } from '~/domain/units/volume-unit';

/**
 * Usable litres as they were read, over time, each with its ±. The table beside it holds the same
 * figures for whoever cannot see it.
 */
export function LevelPlot({
  readings,
  volume,
}: {
  readings: readonly Reading[];
  volume: VolumeUnit;
}) {
  const place = useRef<HTMLDivElement>(null);

  useEffect(() => {
    const element = place.current;
    if (!element) return;
    const dark = window.matchMedia('(prefers-color-scheme: dark)');
    let plot = draw(element, readings, volume);
    const again = () => {
      plot.destroy();
      plot = draw(element, readings, volume);
    };
    const observer = new ResizeObserver(() => {
      if (element.clientWidth !== plot.width) plot.setSize({ width: element.clientWidth, height });
    });
    observer.observe(element);
    dark.addEventListener('change', again);
    return () => {
      observer.disconnect();
      dark.removeEventListener('change', again);
      plot.destroy();
    };
  }, [readings, volume]);

  const sign = volumeUnitSigns[volume];
  return (
    <div
      ref={place}
      role="img"
      aria-label={`Usable ${sign} over time, ${readings.length} readings; the figures are in the table.`}
      className="mb-4 w-full"
    />
  );
}

const height = 190;

function draw(element: HTMLElement, readings: readonly Reading[], volume: VolumeUnit): uPlot {
  const style = getComputedStyle(document.documentElement);
  const colour = (name: string) => style.getPropertyValue(`--${name}`).trim();
  const oldestFirst = [...readings].sort((a, b) => Date.parse(a.at) - Date.parse(b.at));
  const per = litresPerVolumeUnit[volume];
  const times = oldestFirst.map(({ at }) => Date.parse(at) / 1000);
  const figures = oldestFirst.map(({ usableL }) => usableL / per);
  const spread = oldestFirst.map(({ plusMinusL }) => plusMinusL / per);
  const highest = Math.max(...figures.map((figure, i) => figure + spread[i]!));
  const axis = {
    stroke: colour('ink-2'),
    font: `13px ${style.fontFamily}`,
    grid: { stroke: colour('hair'), width: 1 },
    ticks: { stroke: colour('hair'), width: 1 },
  };
  return new uPlot(
    {
      width: element.clientWidth,
      height,
      legend: { show: false },
      cursor: { show: false },
      scales: { y: { range: [0, highest * 1.08 || 1] } },
      axes: [
        { ...axis, space: 90, values: (_plot, splits) => splits.map((at) => day(at)) },
        { ...axis, label: `usable, ${volumeUnitSigns[volume]}`, labelFont: axis.font, size: 46 },
      ],
      series: [
        {},
        {
          stroke: colour('line'),
          width: 1,
          points: { show: true, size: 7, stroke: colour('datum'), fill: colour('datum') },
        },
      ],
      hooks: { draw: [(plot) => drawSpread(plot, times, figures, spread, colour('datum'))] },
    },
    [times, figures],
    element,
  );
}

/** The ± of each reading as an upright bar. */
function drawSpread(
  plot: uPlot,
  times: readonly number[],
  figures: readonly number[],
  spread: readonly number[],
  stroke: string,
): void {
  const { ctx } = plot;
  ctx.save();
  ctx.strokeStyle = stroke;
  ctx.lineWidth = devicePixelRatio;
  ctx.beginPath();
  times.forEach((time, i) => {
    const x = Math.round(plot.valToPos(time, 'x', true)) + 0.5;
    ctx.moveTo(x, plot.valToPos(Math.max(0, figures[i]! - spread[i]!), 'y', true));
    ctx.lineTo(x, plot.valToPos(figures[i]! + spread[i]!, 'y', true));
  });
  ctx.stroke();
  ctx.restore();
}

function day(seconds: number): string {
  return new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short' }).format(
    new Date(seconds * 1000),
  );
}
