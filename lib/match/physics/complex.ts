/**
 * The little complex arithmetic that a network of three elements needs.
 *
 * | symbol | name           | unit           | source     |
 * |--------|----------------|----------------|------------|
 * | re, im | parts of z     | as the caller's | definition |
 */

export interface Complex {
  readonly re: number
  readonly im: number
}

export const ONE: Complex = { re: 1, im: 0 }

export function add(a: Complex, b: Complex): Complex {
  return { re: a.re + b.re, im: a.im + b.im }
}

export function multiply(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re }
}

export function scale(a: Complex, factor: number): Complex {
  return { re: a.re * factor, im: a.im * factor }
}

/** a / b. Division by zero gives NaN: callers branch before it. */
export function divide(a: Complex, b: Complex): Complex {
  const squared = b.re * b.re + b.im * b.im
  return { re: (a.re * b.re + a.im * b.im) / squared, im: (a.im * b.re - a.re * b.im) / squared }
}

export function magnitude(z: Complex): number {
  return Math.hypot(z.re, z.im)
}
