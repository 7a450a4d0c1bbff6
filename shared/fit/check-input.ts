import type { FitInput, Measured } from './fit.schema.ts';
import { placesPerSize } from './between-lines.ts';
import { isGarmentKind } from './garments.ts';

/** Figures by point or zone; a key may be there without a value. */
type Figures = Readonly<Partial<Record<string, number>>>;

/**
 * Throws a RangeError that names the field where the input cannot be meant: a length that is not a positive number, no
 * size, a label used twice, a size held beyond the pattern's or between its lines where it is cut along them, a share or thickness below zero.
 */
export function checkInput(input: FitInput): void {
  const { garment, fabric, sizes } = input;
  if (!isGarmentKind(garment.kind))
    throw new RangeError(`garment.kind: ${String(garment.kind)} is not a garment kind`);
  checkLengths('body', input.body);
  checkSizes(sizes);
  checkAmounts('preferenceMm', input.preferenceMm);
  checkShares('tapeErrorMm', input.tapeErrorMm);
  checkFinite('garment.draftedBustDifferenceMm', garment.draftedBustDifferenceMm);
  checkShare('garment.draftedStretch', garment.draftedStretch);
  checkEdges(garment.seamEdges);
  checkShare('fabric.stretch', fabric.stretch);
  checkShare('fabric.usableShare', fabric.usableShare);
  checkFinite('fabric.shrinkLengthwise', fabric.shrinkLengthwise);
  checkFinite('fabric.shrinkCrosswise', fabric.shrinkCrosswise);
  input.layers?.forEach((layer, index) => {
    checkShare(`layers[${index}].thicknessMm`, layer.thicknessMm);
    if (layer.finishedMm) checkLengths(`layers[${index}].finishedMm`, layer.finishedMm);
  });
  checkPositions('held', input.held, input);
}

/** Throws a RangeError naming the zone where a position is none of the sizes, nor half-way where halves are planned. */
export function checkPositions(field: string, positions: Figures | undefined, input: FitInput): void {
  if (!positions) return;
  const sizes = input.sizes.length;
  for (const [zone, position] of Object.entries(positions)) {
    if (position === undefined) continue;
    if (!(position >= 0 && position <= sizes - 1)) {
      throw new RangeError(`${field}.${zone}: ${position} is not a position among ${sizes} sizes`);
    }
    if (!Number.isInteger(position * placesPerSize(input))) {
      throw new RangeError(`${field}.${zone}: ${position} lies between the lines that are planned by`);
    }
  }
}

function checkSizes(sizes: FitInput['sizes']): void {
  if (sizes.length === 0) throw new RangeError('sizes: at least one size is needed');
  const labels = new Set<string>();
  for (let s = 0; s < sizes.length; s++) {
    const size = sizes[s];
    if (!size) throw new RangeError(`sizes[${s}]: is missing`);
    if (labels.has(size.label)) throw new RangeError(`sizes[${s}].label: "${size.label}" is used twice`);
    labels.add(size.label);
    for (const point in size.body) {
      const value = size.body[point as keyof typeof size.body];
      if (value !== undefined && !isMeasured(value)) {
        throw new RangeError(`sizes[${s}].body.${point}: ${print(value)} is neither a length nor a range`);
      }
    }
    for (const point in size.finished) {
      const value = size.finished[point as keyof typeof size.finished];
      if (value !== undefined && !isLength(value)) {
        throw new RangeError(`sizes[${s}].finished.${point}: ${value} is not a length`);
      }
    }
  }
}

function checkLengths(field: string, lengths: Figures): void {
  for (const point in lengths) {
    const value = lengths[point];
    if (value !== undefined && !isLength(value)) {
      throw new RangeError(`${field}.${point}: ${value} is not a length`);
    }
  }
}

function checkAmounts(field: string, amounts: Figures | undefined): void {
  for (const [point, value] of Object.entries(amounts ?? {})) checkFinite(`${field}.${point}`, value);
}

function checkShares(field: string, amounts: Figures | undefined): void {
  for (const [point, value] of Object.entries(amounts ?? {})) checkShare(`${field}.${point}`, value);
}

function checkEdges(edges: Figures | undefined): void {
  for (const [point, value] of Object.entries(edges ?? {})) {
    if (value !== undefined && !(Number.isInteger(value) && value > 0)) {
      throw new RangeError(`garment.seamEdges.${point}: ${value} is not a number of edges`);
    }
  }
}

function checkFinite(field: string, value: number | undefined): void {
  if (value !== undefined && !Number.isFinite(value))
    throw new RangeError(`${field}: ${value} is not a number`);
}

function checkShare(field: string, value: number | undefined): void {
  if (value !== undefined && !(value >= 0 && value < Infinity)) {
    throw new RangeError(`${field}: ${value} is below zero or not a number`);
  }
}

function isLength(value: number): boolean {
  return value > 0 && value < Infinity;
}

function isMeasured(value: Measured): boolean {
  if (typeof value === 'number') return isLength(value);
  return isLength(value.low) && isLength(value.high) && value.low <= value.high;
}

function print(value: Measured): string {
  return typeof value === 'number' ? String(value) : `${value.low} to ${value.high}`;
}
