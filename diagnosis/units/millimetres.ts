declare const unit: unique symbol;

/** A finite length in millimetres. The only cast of the project to this brand is in `toMillimetres`. */
export type Millimetres = number & { readonly [unit]: 'mm' };

/** @throws RangeError when the number is not finite: a length that cannot be measured is a bug of the caller. */
export function toMillimetres(mm: number): Millimetres {
  if (!Number.isFinite(mm)) throw new RangeError(`a length must be finite, not ${mm}`);
  return mm as Millimetres;
}
