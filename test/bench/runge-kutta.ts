/**
 * What a spreadsheet or a script does instead: integrate x'' + (a − 2q cos 2ξ) x = 0 over one RF period with the classical
 * fourth-order Runge–Kutta method for both fundamental solutions. Returns the half-trace. The cosines of a step are
 * tabulated, as anyone would after the first afternoon.
 */
export class RungeKutta {
  readonly #steps: number;
  readonly #cosines: Float64Array;

  constructor(steps: number) {
    this.#steps = steps;
    this.#cosines = new Float64Array(2 * steps + 1);
    for (let i = 0; i <= 2 * steps; i++) this.#cosines[i] = Math.cos((Math.PI * i) / steps);
  }

  halfTrace(a: number, q: number): number {
    const first = this.#end(a, q, 1, 0, 0);
    const second = this.#end(a, q, 0, 1, 1);
    return (first + second) / 2;
  }

  #end(a: number, q: number, position: number, velocity: number, wanted: 0 | 1): number {
    const h = Math.PI / this.#steps;
    const cosines = this.#cosines;
    let x = position;
    let v = velocity;
    for (let i = 0; i < this.#steps; i++) {
      const start = 2 * q * cosines[2 * i]! - a;
      const middle = 2 * q * cosines[2 * i + 1]! - a;
      const end = 2 * q * cosines[2 * i + 2]! - a;
      const l1 = start * x;
      const k2 = v + (h / 2) * l1;
      const l2 = middle * (x + (h / 2) * v);
      const k3 = v + (h / 2) * l2;
      const l3 = middle * (x + (h / 2) * k2);
      const k4 = v + h * l3;
      const l4 = end * (x + h * k3);
      x += (h / 6) * (v + 2 * k2 + 2 * k3 + k4);
      v += (h / 6) * (l1 + 2 * l2 + 2 * l3 + l4);
    }
    return wanted === 0 ? x : v;
  }
}
