import { describe, expect, it } from 'vitest';
import type { PointResult, ZonePlan } from '../../../../../shared/fit/fit.schema.ts';
import type { ZoneId } from '../../../../../shared/fit/fit-words.ts';
import type { PointId } from '../../../../../shared/points/point-ids.ts';
import { layOut } from '../../../../../src/fit/parts/layout.ts';
import { pathLines } from '../../../../../src/fit/parts/path-lines.ts';
import { rowsInOrder } from '../../../../../src/fit/parts/row-order.ts';
import { pathGeometry } from '../../../../../src/fit/parts/size-window.ts';

const zone = (id: ZoneId, position: number, governedBy: PointId | null): ZonePlan => ({
  zone: id,
  size: { label: String(position), position },
  governedBy,
});
const point = (id: PointId, of: ZoneId): PointResult => ({
  point: id,
  zone: of,
  size: { label: '0', position: 0 },
  bodyMm: 900,
  chartMm: null,
  finishedMm: null,
  easeMm: null,
  draftedEaseMm: null,
  floorMm: null,
  leewayMm: null,
  deviationMm: null,
  verdict: 'unknown',
  borderline: false,
});

const plan = {
  zones: [
    zone('hip', 3, 'hip'),
    zone('sleeve', 2, 'upperArm'),
    zone('neck', 1, null),
    zone('waist', 3, 'waist'),
    zone('shoulder', 1, 'upperBust'),
    zone('hem', 3, null),
  ],
  points: [
    point('highHip', 'hip'),
    point('hip', 'hip'),
    point('upperArm', 'sleeve'),
    point('waist', 'waist'),
    point('upperBust', 'shoulder'),
    point('shoulderLength', 'shoulder'),
  ],
};

describe('rowsInOrder', () => {
  const rows = rowsInOrder(plan);

  it('runs from neck to hem and puts the sleeve behind, as a piece of its own', () => {
    expect(rows.map((row) => row.key)).toEqual([
      'neck',
      'shoulderLength',
      'upperBust',
      'waist',
      'highHip',
      'hip',
      'hem',
      'upperArm',
    ]);
    expect(rows.filter((row) => row.isBranch).map((row) => row.zone)).toEqual(['neck', 'sleeve']);
  });

  it('gives each zone one handle, in the row that governs it', () => {
    expect(rows.filter((row) => row.hasNode).map((row) => row.key)).toEqual([
      'neck',
      'upperBust',
      'waist',
      'hip',
      'hem',
      'upperArm',
    ]);
  });

  it('leaves the handle where it was while another point governs a held zone', () => {
    const held = {
      ...plan,
      zones: plan.zones.map((each) => (each.zone === 'hip' ? zone('hip', 5, 'highHip') : each)),
    };
    const handle = (of: ReturnType<typeof rowsInOrder>) =>
      of.find((row) => row.zone === 'hip' && row.hasNode)?.key;
    expect(handle(rowsInOrder(held))).toBe('highHip');
    expect(handle(rowsInOrder(held, plan.zones))).toBe('hip');
  });

  it('says whom a zone without a point follows', () => {
    expect(rows.find((row) => row.zone === 'hem')?.follows).toBe('hip');
    expect(rows.find((row) => row.zone === 'neck')?.follows).toBe('shoulder');
    expect(rows.find((row) => row.zone === 'waist')?.follows).toBeNull();
  });
});

describe('the drawing', () => {
  const rows = rowsInOrder(plan);

  it('stacks rows without overlap, at any width', () => {
    for (const width of [320, 350, 600, 900, 1328]) {
      const { rows: places, height, bars, path } = layOut(rows, width, 6);
      places.forEach((place, index) => {
        const next = places[index + 1];
        if (next) expect(next.top - next.heading).toBeGreaterThanOrEqual(place.top + place.height);
      });
      expect(height).toBe(places.at(-1)!.top + places.at(-1)!.height);
      expect(bars.left).toBeGreaterThanOrEqual(path.left + path.width);
      expect(bars.left + bars.width).toBeLessThanOrEqual(width);
    }
  });

  it('draws neck and sleeve as branches of their own, not in the trunk', () => {
    const { rows: places } = layOut(rows, 1328, 6);
    const geometry = pathGeometry({ start: 0, count: 6 }, 292, 14);
    const lines = pathLines(rows, places, geometry);
    const sleeveY = places.at(-1)!.middle;
    expect(lines.trunk).not.toContain(` ${sleeveY} `);
    expect(lines.sleeve).toContain(`L${geometry.toX(2)} ${sleeveY}`);
    expect(lines.neck.startsWith(`M${geometry.toX(1)} ${places[0]!.middle}`)).toBe(true);
  });

  it('has no branch where the garment has none', () => {
    const skirt = rowsInOrder({ zones: [zone('waist', 1, 'waist'), zone('hip', 2, 'hip')], points: [] });
    const lines = pathLines(
      skirt,
      layOut(skirt, 1328, 6).rows,
      pathGeometry({ start: 0, count: 6 }, 292, 14),
    );
    expect(lines.neck).toBe('');
    expect(lines.sleeve).toBe('');
    expect(lines.trunk).not.toBe('');
  });
});
