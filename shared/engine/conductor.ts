import { createModifiedBessel, modifiedBessel } from '../numerics/bessel';
import { ALUMINIUM_COEFFICIENT_PER_K, MU_0, RESISTANCE_REFERENCE_C } from './constants';
import type { ConductorData } from './types';

const bessel = createModifiedBessel();

/**
 * Growth of a conductor's d.c. resistance from 20 °C: 1 + α(T − 20 °C).
 *
 * @param c conductor, of which only the coefficient counts
 * @param temperatureC temperature, °C
 */
export function resistanceGrowth(c: ConductorData, temperatureC: number): number {
  return (
    1 +
    (c.temperatureCoefficientPerK ?? ALUMINIUM_COEFFICIENT_PER_K) * (temperatureC - RESISTANCE_REFERENCE_C)
  );
}

/**
 * D.c. resistance of a `tube` conductor at its temperature: R₂₀·(1 + α(T − 20 °C)).
 *
 * @param c conductor with dcResistance20OhmPerKm
 * @example
 * dcResistanceOhmPerKm({ model: 'tube', diameterMm: 28, dcResistance20OhmPerKm: 0.07, temperatureC: 75 }) // → 0.08552
 * @returns Ω/km
 */
export function dcResistanceOhmPerKm(c: ConductorData): number {
  return (c.dcResistance20OhmPerKm ?? 0) * resistanceGrowth(c, c.temperatureC ?? RESISTANCE_REFERENCE_C);
}

/**
 * Internal impedance of a round tube or solid wire with current in the tube only, non-magnetic, return outside:
 * Z = ρg/(2πa) · [I₀(ga)K₁(gb) + K₀(ga)I₁(gb)] / [I₁(ga)K₁(gb) − K₁(ga)I₁(gb)], g = √(jωμ₀/ρ), a and b the outer
 * and inner radius, ρ = R_dc·π(a² − b²) (Schelkunoff 1934). The d.c. limit is R_dc itself.
 *
 * @param dcOhmPerKm d.c. resistance at temperature, Ω/km
 * @param outerRadiusM outer radius, m
 * @param innerRadiusM radius of the core, m; 0 for a solid wire
 * @param omega angular frequency, rad/s
 * @param out receives [R, X] in Ω/km
 */
export function tubeImpedance(
  dcOhmPerKm: number,
  outerRadiusM: number,
  innerRadiusM: number,
  omega: number,
  out: Float64Array,
): void {
  const area = Math.PI * (outerRadiusM * outerRadiusM - innerRadiusM * innerRadiusM);
  const resistivity = (dcOhmPerKm / 1000) * area;
  // √j = (1 + j)/√2, so both arguments lie on the diagonal.
  const diagonal = Math.sqrt((omega * MU_0) / (2 * resistivity));
  const x = diagonal * outerRadiusM;
  const y = diagonal * innerRadiusM;
  modifiedBessel(x, x, bessel);
  const [i0r, i0i] = bessel.i0;
  const [i1r, i1i] = bessel.i1;
  const [k0r, k0i] = bessel.k0;
  const [k1r, k1i] = bessel.k1;
  let nr = i0r;
  let ni = i0i;
  let dr = i1r;
  let di = i1i;
  if (y > 0) {
    modifiedBessel(y, y, bessel);
    const [ir, ii] = bessel.i1;
    const [kr, ki] = bessel.k1;
    // The product I₁(gb)·K(ga) carries e^(−2(x − y)(1 + j)) against the other one.
    const decay = Math.exp(-2 * (x - y));
    const er = decay * Math.cos(2 * (x - y));
    const ei = -decay * Math.sin(2 * (x - y));
    const jr = ir * er - ii * ei;
    const ji = ir * ei + ii * er;
    nr = i0r * kr - i0i * ki + (k0r * jr - k0i * ji);
    ni = i0r * ki + i0i * kr + (k0r * ji + k0i * jr);
    dr = i1r * kr - i1i * ki - (k1r * jr - k1i * ji);
    di = i1r * ki + i1i * kr - (k1r * ji + k1i * jr);
  }
  // ρg/(2πa), Ω/km: the same real factor on both parts of (1 + j).
  const factor = (1000 * resistivity * diagonal) / (2 * Math.PI * outerRadiusM * (dr * dr + di * di));
  const qr = nr * dr + ni * di;
  const qi = ni * dr - nr * di;
  out[0] = factor * (qr - qi);
  out[1] = factor * (qr + qi);
}

/**
 * What a conductor adds to the diagonal of Z beside the field outside it. `handbook`: the tabled resistance and,
 * through the GMR, ωμ₀/2π·ln(r/GMR); `tube`: skin effect. Both stand beside an external term with the outer radius.
 *
 * @param c conductor, checked
 * @param omega angular frequency, rad/s
 * @param out receives [R, X] in Ω/km
 */
export function internalImpedance(c: ConductorData, omega: number, out: Float64Array): void {
  if (c.model === 'handbook') {
    out[0] = c.acResistanceOhmPerKm ?? 0;
    out[1] =
      ((1000 * omega * MU_0) / (2 * Math.PI)) * Math.log(c.diameterMm / (2 * (c.gmrMm ?? c.diameterMm / 2)));
    return;
  }
  tubeImpedance(dcResistanceOhmPerKm(c), c.diameterMm / 2000, (c.coreDiameterMm ?? 0) / 2000, omega, out);
}

/**
 * A.c. resistance at another temperature. `tube`: skin effect at the d.c. resistance of that temperature; `handbook`:
 * the tabled value carried over with the temperature coefficient (from 20 °C when its temperature is not given).
 *
 * @param c conductor, checked
 * @param temperatureC wanted temperature, °C
 * @param frequencyHz frequency, Hz
 * @returns Ω/km
 */
export function conductorResistanceOhmPerKm(
  c: ConductorData,
  temperatureC: number,
  frequencyHz: number,
): number {
  if (c.model === 'handbook') {
    const tabled = resistanceGrowth(c, c.temperatureC ?? RESISTANCE_REFERENCE_C);
    return ((c.acResistanceOhmPerKm ?? 0) * resistanceGrowth(c, temperatureC)) / tabled;
  }
  const out = new Float64Array(2);
  internalImpedance({ ...c, temperatureC }, 2 * Math.PI * frequencyHz, out);
  return out[0] as number;
}
