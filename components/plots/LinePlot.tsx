'use client';

import { Chart as ChartJs, Legend, LinearScale, LineElement, PointElement, type ChartData, type ChartOptions } from 'chart.js';
import { useMemo } from 'react';
import { Line } from 'react-chartjs-2';
import { useInks } from './use-inks';

ChartJs.register(LinearScale, LineElement, PointElement, Legend);

export interface LinePlotProps {
  xLabel: string;
  yLabel: string;
  series: readonly { label: string; points: readonly { x: number; y: number }[] }[];
  /** Straight across. */
  marks: readonly { label: string; y: number }[];
  /** Where one stands, on the x axis; none for lines through what was measured, which have dots instead. */
  here?: number;
}

/** Lines over one quantity, in the inks of the page. It is for the eye: words and a table beside it say the same. */
export default function LinePlot({ xLabel, yLabel, series, marks, here }: LinePlotProps) {
  const inks = useInks();
  const data = useMemo<ChartData<'line', { x: number; y: number }[]>>(() => {
    const [first] = series;
    const xs = first?.points.map(({ x }) => x) ?? [];
    const [from, to] = [Math.min(...xs), Math.max(...xs)];
    const nearest = here === undefined ? undefined : first?.points.reduce<{ x: number; y: number } | undefined>((held, point) => (held && Math.abs(held.x - here) <= Math.abs(point.x - here) ? held : point), undefined);
    return {
      datasets: [
        ...series.map(({ label, points }, index) => ({
          label,
          data: [...points],
          borderColor: index === 0 ? inks.oil : inks.ink,
          borderWidth: 3,
          borderDash: index === 0 ? [] : [2, 3],
          pointRadius: here === undefined ? 5 : 0,
          pointBackgroundColor: inks.ink,
        })),
        ...marks.map(({ label, y }) => ({ label, data: [{ x: from, y }, { x: to, y }], borderColor: inks.ink, borderWidth: 1.5, borderDash: [8, 5], pointRadius: 0 })),
        ...(nearest ? [{ label: 'Your readings', data: [nearest], borderColor: inks.ink, backgroundColor: inks.ink, pointRadius: 7, pointStyle: 'rectRot' as const, showLine: false }] : []),
      ],
    };
  }, [series, marks, here, inks]);
  const options = useMemo<ChartOptions<'line'>>(() => {
    const xs = series[0]?.points.map(({ x }) => x) ?? [];
    const axis = (text: string) => ({
      type: 'linear' as const,
      title: { display: true, text, color: inks.ink, font: { family: inks.text, size: 14 } },
      ticks: { color: inks.soft, font: { family: inks.mono, size: 13 }, maxTicksLimit: 7 },
      grid: { color: inks.rule },
      border: { color: inks.ink },
    });
    return {
      animation: false,
      responsive: true,
      maintainAspectRatio: false,
      events: [],
      scales: { x: { ...axis(xLabel), min: Math.min(...xs), max: Math.max(...xs) }, y: axis(yLabel) },
      plugins: { legend: { labels: { color: inks.ink, font: { family: inks.text, size: 14 }, boxWidth: 28, boxHeight: 1 } } },
    };
  }, [series, xLabel, yLabel, inks]);
  return <Line data={data} options={options} />;
}
