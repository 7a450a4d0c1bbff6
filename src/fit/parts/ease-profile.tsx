import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceDot,
  ReferenceLine,
  ResponsiveContainer,
  XAxis,
  YAxis,
} from 'recharts';
import type { PointResult } from '../../../shared/fit/fit.schema.ts';
import type { SayContext } from '../../../shared/fit/say-words.ts';
import { easeDomain, easeTicks } from './ease-scale.ts';

interface EaseProfileProps {
  result: PointResult;
  ladder: readonly (number | null)[];
  context: SayContext;
}

const HEIGHT = 300;
const TICK = { fontSize: 13, fill: 'var(--ink-2)' };

/** One point's ease in every size: the cloth's dashed line over the body's solid one, the room between them filled. */
export function EaseProfile({ result, ladder, context }: EaseProfileProps) {
  const { easeMm, floorMm, size } = result;
  const isCalm = window.matchMedia('(prefers-reduced-motion: reduce)').matches;
  const data = ladder.map((mm, position) => ({
    position,
    mm,
    room: mm === null || mm < (floorMm ?? 0) ? null : [floorMm ?? 0, mm],
  }));
  const domain = easeDomain([...ladder, floorMm]);
  const ticks = easeTicks(domain, HEIGHT, context.unit, 40);
  const last = ladder.length - 1;
  const label = (value: string, fill = 'var(--ink)') => ({
    value,
    position: 'insideBottomRight' as const,
    fontSize: 13,
    fill,
  });
  return (
    <ResponsiveContainer width="100%" height={HEIGHT}>
      <ComposedChart
        data={data}
        margin={{ top: 22, right: 12, bottom: 4, left: 0 }}
        accessibilityLayer={false}
      >
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis
          dataKey="position"
          type="number"
          domain={[0, last]}
          ticks={data.map(({ position }) => position)}
          tickFormatter={(position: number) => context.sizes[position] ?? ''}
          tick={TICK}
          tickLine={false}
          axisLine={false}
          interval="preserveStartEnd"
          minTickGap={14}
        />
        <YAxis
          width={52}
          tick={TICK}
          tickLine={false}
          axisLine={false}
          domain={[domain.low, domain.high]}
          ticks={ticks.map((tick) => tick.mm)}
          tickFormatter={(mm: number) => ticks.find((tick) => tick.mm === mm)?.label ?? ''}
        />
        <Area
          dataKey="room"
          fill="var(--woad-tint)"
          stroke="none"
          fillOpacity={1}
          isAnimationActive={!isCalm}
        />
        <ReferenceLine y={0} stroke="var(--ink)" strokeWidth={2.5} label={label('body')} />
        {floorMm !== null && (
          <ReferenceLine
            y={floorMm}
            stroke="var(--ink-2)"
            strokeWidth={1.5}
            label={label('wearing ease', 'var(--ink-2)')}
          />
        )}
        <Line
          dataKey="mm"
          stroke="var(--woad)"
          strokeWidth={2.5}
          strokeDasharray="8 5"
          dot={
            data.length <= 30
              ? { r: 2.5, fill: 'var(--paper)', stroke: 'var(--woad)', strokeDasharray: '0' }
              : false
          }
          isAnimationActive={!isCalm}
        />
        {easeMm !== null && (
          <ReferenceDot
            x={size.position}
            y={easeMm}
            r={7}
            fill="var(--paper)"
            stroke="var(--woad)"
            strokeWidth={2.5}
            label={{
              value: size.label,
              position: 'top',
              dx: -6,
              fontSize: 14,
              fontWeight: 700,
              fill: 'var(--ink)',
            }}
          />
        )}
      </ComposedChart>
    </ResponsiveContainer>
  );
}
