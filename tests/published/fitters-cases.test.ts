import { describe, expect, it } from 'vitest';
import type { SizeRow } from '../../shared/fit/fit.schema.ts';
import { planFit } from '../../shared/fit/plan-fit.ts';
import { caseSizes, fitInput, INCH, inches, labels } from '../support/fit-tables.ts';

// What a fitter would do, as the trade teaches it: choose tops by the bust and trousers by the hip (Carlson, EC 742,
// Oregon State Univ. Extension, 1969; Principles of Pattern Alteration, E-372, Texas Cooperative Extension, 2006), full
// skirts by the waist, and blend between the lines of a multi-size pattern (common practice). Inches; invented pattern.
const BODICE = ['bust', 'waist', 'hip'] as const;

describe('dress', () => {
  const sizes = caseSizes(BODICE);

  it('pear, 34/28/40: 12 at the bust, 14 at the waist, 16 at the hip, since each point lies on its own row', () => {
    const plan = planFit(
      fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, inches({ bust: 34, waist: 28, hip: 40 })),
    );
    expect(plan.status).toBe('planned');
    expect(labels(plan)).toMatchObject({ shoulder: '12', bust: '12', waist: '14', hip: '16', hem: '16' });
    expect(plan.options[0]?.kind).toBe('blend');
    expect(plan.points.map((point) => point.verdict)).toEqual(['asDrafted', 'asDrafted', 'asDrafted']);
  });

  it('inverted triangle, 40/30/37: shoulder and bust 18, waist 16, hip 14, since the chest rules the shoulder and a hip between sizes leans to the larger', () => {
    const plan = planFit(
      fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, inches({ bust: 40, waist: 30, hip: 37 })),
    );
    expect(labels(plan)).toMatchObject({ shoulder: '18', bust: '18', waist: '16', hip: '14' });
  });

  it('half a size between everywhere: the larger, as is usual in a woven', () => {
    const plan = planFit(
      fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, inches({ bust: 37, waist: 29, hip: 39 })),
    );
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['16']));
    expect(plan.reasons.map((reason) => reason.code)).toContain('tieToLarger');
  });
});

describe('trousers', () => {
  it('waist 27, hip 42: 18 at the hip and two or three sizes less at the waist, since the hip chooses and 6 in are not taken out of a waist seam', () => {
    const sizes = caseSizes(['waist', 'hip']);
    const plan = planFit(
      fitInput({ kind: 'trousers', silhouette: 'fitted' }, sizes, inches({ waist: 27, hip: 42 })),
    );
    const zones = labels(plan);
    expect(zones).toMatchObject({ hip: '18', thigh: '18', knee: '18', hem: '18' });
    expect(['12', '14']).toContain(zones.waist);
    expect(plan.alterations).toEqual([]);
    expect(plan.blends).toHaveLength(1);
  });

  it('the same where finished measurements are known', () => {
    const sizes = caseSizes(['waist', 'hip'], { waist: 0.75, hip: 2.5 });
    const plan = planFit(
      fitInput({ kind: 'trousers', silhouette: 'fitted' }, sizes, inches({ waist: 27, hip: 42 })),
    );
    expect(labels(plan)).toMatchObject({ hip: '18' });
    expect(['12', '14']).toContain(labels(plan).waist);
  });
});

describe('full skirt', () => {
  it('waist 28, hip 43: 14 everywhere, since a full skirt is chosen by the waist', () => {
    const sizes = caseSizes(['waist', 'hip'], { waist: 0.75, hip: 20 });
    const plan = planFit(
      fitInput({ kind: 'fullSkirt', silhouette: 'loose' }, sizes, inches({ waist: 28, hip: 43 })),
    );
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['14']));
  });
});

describe('boned bodice', () => {
  it('on its own row: as drafted, not less than wearing ease, since the drafter meant it to lie on the body', () => {
    const sizes = caseSizes(BODICE, { bust: 0, waist: -1, hip: 0.5 });
    const plan = planFit(
      fitInput({ kind: 'bonedBodice', silhouette: 'close' }, sizes, inches({ bust: 36, waist: 28, hip: 38 })),
    );
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['14']));
    for (const point of plan.points) expect(point).toMatchObject({ verdict: 'asDrafted', leewayMm: 0 });
    expect(plan.cautions.map((caution) => caution.code)).toContain('belowHandbook');
    expect(plan.cautions.map((caution) => caution.code)).not.toContain('belowFloor');
  });
});

describe('sizes S, M, L by ranges', () => {
  const row = (
    label: string,
    bust: [number, number],
    waist: [number, number],
    hip: [number, number],
  ): SizeRow => {
    const range = ([low, high]: [number, number]) => ({ low: low * INCH, high: high * INCH });
    const middle = ([low, high]: [number, number]) => ((low + high) / 2) * INCH;
    return {
      label,
      body: { bust: range(bust), waist: range(waist), hip: range(hip) },
      finished: { bust: middle(bust) + 76, waist: middle(waist) + 50, hip: middle(hip) + 70 },
    };
  };
  const sizes = [
    row('S', [32, 34], [25, 27], [35, 37]),
    row('M', [36, 38], [29, 31], [39, 41]),
    row('L', [40, 42], [33, 35], [43, 45]),
  ];

  it('a body at M’s upper ends is an M with both tables, since the drafter’s ease is meant for the whole range', () => {
    const plan = planFit(
      fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, inches({ bust: 38, waist: 31, hip: 41 })),
    );
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['M']));
    for (const point of plan.points) expect(point.verdict).toBe('asDrafted');
  });

  it('so is one at M’s lower ends', () => {
    const plan = planFit(
      fitInput({ kind: 'dress', silhouette: 'fitted' }, sizes, inches({ bust: 36, waist: 29, hip: 39 })),
    );
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['M']));
  });
});

describe('boxy shirt, finished measurements only', () => {
  // 6.5 in of ease at the bust of each size; the side seams run straight down.
  const sizes = [34, 36, 38, 40, 42].map((bust, index) => ({
    label: String(12 + 2 * index),
    body: {},
    finished: inches({ bust: bust + 6.5, waist: bust + 6.5, hip: bust + 7 }),
  }));
  const sizeFor = (waist: number) =>
    labels(
      planFit(fitInput({ kind: 'shirt', silhouette: 'loose' }, sizes, inches({ bust: 38, waist, hip: 40 }))),
    );

  it('the waist does not choose, since no handbook says what ease a boxy waist should have', () => {
    for (const waist of [24, 28, 32, 36, 40]) {
      expect(new Set(Object.values(sizeFor(waist)))).toEqual(new Set(['16']));
    }
  });

  it('but it must close: a waist larger than the cloth less wearing ease takes a larger size there', () => {
    expect(sizeFor(46).waist).not.toBe('16');
  });
});

describe('shoulder length', () => {
  it.each([
    ['with the bust alone', undefined],
    ['with the upper bust too', 32],
  ])('8 mm more: no other size, since a shoulder seam is altered, not graded up (%s)', (_name, upperBust) => {
    const sizes = caseSizes(BODICE).map((row, size) => ({
      ...row,
      body: {
        ...row.body,
        shoulderLength: 122 + 3 * size,
        ...(upperBust === undefined ? {} : { upperBust: (upperBust + 2 * size) * INCH }),
      },
    }));
    const body = {
      ...inches({ bust: 38, waist: 30, hip: 40 }),
      ...(upperBust === undefined ? {} : { upperBust: (upperBust + 4) * INCH }),
      shoulderLength: 128 + 8,
    };
    for (const kind of ['dress', 'shirt', 'jacket'] as const) {
      const plan = planFit(fitInput({ kind, silhouette: 'fitted' }, sizes, body));
      expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['16']));
    }
  });
});

describe('cape', () => {
  // Common practice: about 4 in at the bust and 12 in at the hip, worn open or barely overlapped, sized by shoulder and neck.
  it.each(['closed', 'open'] as const)(
    'drafted with 4, 9 and 12 in, a hip two sizes over: one size, since it hangs from the shoulder (worn %s)',
    (worn) => {
      const sizes = caseSizes(BODICE, { bust: 4, waist: 9, hip: 12 });
      const plan = planFit(
        fitInput(
          { kind: 'cape', silhouette: 'loose', worn },
          sizes,
          inches({ bust: 36, waist: 28, hip: 42 }),
        ),
      );
      expect(plan.status).toBe('planned');
      expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['14']));
      expect(plan.alterations).toEqual([]);
      for (const point of plan.points) expect(point.verdict).toBe('asDrafted');
    },
  );

  it('shoulder and neck decide where they are given, whatever bust and hip say', () => {
    const sizes = caseSizes(BODICE, { bust: 4, waist: 9, hip: 12 }).map((row, size) => ({
      ...row,
      body: { ...row.body, shoulderWidth: 380 + 12 * size, neck: 350 + 12 * size },
    }));
    const body = { ...inches({ bust: 36, waist: 28, hip: 42 }), shoulderWidth: 404, neck: 374 };
    const plan = planFit(fitInput({ kind: 'cape', silhouette: 'loose', worn: 'open' }, sizes, body));
    expect(labels(plan)).toMatchObject({ neck: '16', shoulder: '16' });
  });
});

describe('shirt', () => {
  // Charts on which the neck of 43 cm lies two, three and four sizes above the chest of 100 cm.
  it.each([41, 40, 39])(
    'chest 100 cm, neck 43 cm: the chest rules the shoulder, neckline and collar go up together, since a collar is drafted to its neckline (neck %d at chest 100)',
    (neckAt100) => {
      const sizes = [92, 96, 100, 104, 108, 112, 116].map((chest, size) => ({
        label: String(36 + size),
        body: { bust: 10 * chest, neck: 10 * (neckAt100 - 2 + size) },
        finished: {},
      }));
      const garment = { kind: 'shirt', silhouette: 'semiFitted' } as const;
      const plan = planFit(fitInput(garment, sizes, { bust: 1000, neck: 430 }));
      expect(labels(plan)).toMatchObject({
        shoulder: '38',
        sleeve: '38',
        bust: '38',
        waist: '38',
        neck: '40',
      });
      expect(plan.blends).toHaveLength(1);
      expect(plan.blends[0]).toMatchObject({ fromZone: 'shoulder', toZone: 'neck', point: 'neck' });
    },
  );
});

describe('an own garment measured flat', () => {
  it('one size with finished measurements only is accepted and judged against the handbook', () => {
    const sizes = [{ label: 'my coat', body: {}, finished: { bust: 1120, waist: 1080, hip: 1160 } }];
    const plan = planFit(
      fitInput({ kind: 'coat', silhouette: 'fitted' }, sizes, { bust: 960, waist: 800, hip: 1020 }),
    );
    expect(plan.status).toBe('planned');
    expect(new Set(Object.values(labels(plan)))).toEqual(new Set(['my coat']));
    expect(plan.options).toHaveLength(1);
    expect(plan.points.find(({ point }) => point === 'bust')).toMatchObject({
      easeMm: 160,
      verdict: 'asDrafted',
    });
  });
});
