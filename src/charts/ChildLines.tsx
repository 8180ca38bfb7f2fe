import { scaleLinear, scalePoint } from 'd3-scale';
import { line } from 'd3-shape';
import type { Palette } from './palette.ts';

interface Props {
  readonly width: number;
  readonly palette: Palette;
  readonly label: string;
  /** Names of the two phases. */
  readonly before: string;
  readonly after: string;
  /** Percent 0–100 of each child that has both. */
  readonly lines: readonly { readonly child: string; readonly before: number; readonly after: number }[];
  readonly mean: { readonly before: number; readonly after: number } | null;
  /** What stands beside the ends of the thick line, and its name. */
  readonly meanLabels: { readonly before: string; readonly after: string; readonly name: string };
}

/** Each child's percentages before and after as a thin line, the class mean as the thick one. */
export function ChildLines({ width, palette, label, before, after, lines, mean, meanLabels }: Props) {
  const height = Math.min(400, Math.max(280, width * 0.72));
  const x = scalePoint(['before', 'after'], [118, width - 84]);
  const y = scaleLinear([0, 100], [height - 44, 18]);
  const at = (phase: 'before' | 'after'): number => x(phase) ?? 0;
  const path = (from: number, to: number): string =>
    line()([
      [at('before'), y(from)],
      [at('after'), y(to)],
    ]) ?? '';
  return (
    <svg
      xmlns="http://www.w3.org/2000/svg"
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      role="img"
      aria-label={label}
      fontFamily={palette.font}
    >
      {[0, 25, 50, 75, 100].map((tick) => (
        <g key={tick}>
          <line x1={44} x2={width - 12} y1={y(tick)} y2={y(tick)} stroke={palette.rule} strokeWidth={1.2} />
          <text
            x={36}
            y={y(tick)}
            dominantBaseline="central"
            textAnchor="end"
            fontSize={14}
            fill={palette.ink2}
          >
            {tick}
          </text>
        </g>
      ))}
      {lines.map((one) => (
        <g key={one.child} stroke={palette.ink2} fill={palette.ink2}>
          <path d={path(one.before, one.after)} strokeWidth={1.6} strokeOpacity={0.65} fill="none" />
          <circle cx={at('before')} cy={y(one.before)} r={3.6} stroke="none" />
          <circle cx={at('after')} cy={y(one.after)} r={3.6} stroke="none" />
        </g>
      ))}
      {mean !== null && (
        <g stroke={palette.blue} fill={palette.blue}>
          <path d={path(mean.before, mean.after)} strokeWidth={5} fill="none" />
          <circle cx={at('before')} cy={y(mean.before)} r={8} stroke="none" />
          <circle cx={at('after')} cy={y(mean.after)} r={8} stroke="none" />
          <g stroke={palette.sheet} strokeWidth={4} paintOrder="stroke" fontWeight={680} fontSize={17}>
            <text x={at('before') - 14} y={y(mean.before)} dominantBaseline="central" textAnchor="end">
              {meanLabels.before}
            </text>
            <text x={at('after') + 14} y={y(mean.after)} dominantBaseline="central">
              {meanLabels.after}
            </text>
            <text x={at('after') + 14} y={y(mean.after) + 20} dominantBaseline="central" fontSize={14}>
              {meanLabels.name}
            </text>
          </g>
        </g>
      )}
      {(['before', 'after'] as const).map((phase) => (
        <text key={phase} x={at(phase)} y={height - 12} textAnchor="middle" fontSize={16} fill={palette.ink}>
          {phase === 'before' ? before : after}
        </text>
      ))}
    </svg>
  );
}
