/** The part of js-quantities that the tests use; the package ships no types. */
declare module 'js-quantities' {
  interface Quantity {
    scalar: number;
    to(unit: string): Quantity;
  }
  export default function Qty(value: number, unit: string): Quantity;
}
