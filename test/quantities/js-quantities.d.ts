declare module "js-quantities" {
  interface Qty {
    readonly scalar: number;
    toBase(): Qty;
    to(units: string): Qty;
  }
  function Qty(text: string): Qty;
  export default Qty;
}
