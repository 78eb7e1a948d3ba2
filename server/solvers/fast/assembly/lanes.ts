/** Two doubles at once, under short names: the compiler puts each in the place of its call. */

export function at(array: usize, i: i32): f64 {
  return load<f64>(array + ((i as usize) << 3));
}
export function put(array: usize, i: i32, value: f64): void {
  store<f64>(array + ((i as usize) << 3), value);
}
export function pairAt(array: usize, i: i32): v128 {
  return v128.load(array + ((i as usize) << 3));
}
export function putPair(array: usize, i: i32, value: v128): void {
  v128.store(array + ((i as usize) << 3), value);
}

export function both(value: f64): v128 {
  return f64x2.splat(value);
}
export function add(a: v128, b: v128): v128 {
  return f64x2.add(a, b);
}
export function sub(a: v128, b: v128): v128 {
  return f64x2.sub(a, b);
}
export function mul(a: v128, b: v128): v128 {
  return f64x2.mul(a, b);
}
export function div(a: v128, b: v128): v128 {
  return f64x2.div(a, b);
}
export function root(a: v128): v128 {
  return f64x2.sqrt(a);
}
export function size(a: v128): v128 {
  return f64x2.abs(a);
}
/** b < a ? b : a */
export function lesser(a: v128, b: v128): v128 {
  return f64x2.pmin(a, b);
}
/** a < b ? b : a */
export function greater(a: v128, b: v128): v128 {
  return f64x2.pmax(a, b);
}
export function below(a: v128, b: v128): v128 {
  return f64x2.lt(a, b);
}
export function upTo(a: v128, b: v128): v128 {
  return f64x2.le(a, b);
}
export function and(a: v128, b: v128): v128 {
  return v128.and(a, b);
}
/** Whether a comparison holds in both lanes */
export function holds(mask: v128): bool {
  return i64x2.all_true(mask);
}
/** a where the mask holds, b elsewhere */
export function choose(a: v128, b: v128, mask: v128): v128 {
  return v128.bitselect(a, b, mask);
}
