import type { CauseCode } from '../types';
import { figure, withUnit } from '../words';
import type { Words } from './item';
import type { Problem, Target } from './problem';
import { isShunt } from './problem';

/** A slip that multiplies the declared value. */
export interface FactorSlip {
  code: CauseCode;
  /** Slips of one code and key are one matter: the same base, the same shift. */
  key: string;
  /** What the declared value is multiplied by to put it right. */
  factor: number;
  /** Log prior beside that of any slip. */
  prior: number;
  /** Made for a whole set of values at once, hardly ever for one. */
  isWhole?: true;
  /** What is assumed, as it follows "Fits within 0.1 % if". */
  words: Words;
}

const KM_PER_MILE = 1.609344;

/** Bases that people use, MVA. */
const BASES_MVA = [1, 10, 50, 100, 200, 500, 1000] as const;

/** Powers of ten by which a decimal point or a metric prefix slips. */
const SHIFTS = [1, 2, 3, 6] as const;

/** Price of a slip that the unit as declared makes unlikely. */
const ODD = -2;

/** Every factor slip that one declared value may have suffered. */
export function factorSlips(target: Target, problem: Problem): FactorSlip[] {
  return [
    ...lengthSlips(target, problem),
    ...(isShunt(target.parameter) ? chargingSlips(target, problem) : []),
    ...baseSlips(target, problem),
    ...shiftSlips(),
  ];
}

function lengthSlips(target: Target, { lengthKm }: Problem): FactorSlip[] {
  const isPerLength = target.value.form === 'per-length';
  const isPerMile = target.value.unit.endsWith('/mi');
  const total = (): string => withUnit(lengthKm, 'km');
  return [
    {
      code: 'per-mile',
      key: '',
      factor: 1 / KM_PER_MILE,
      prior: isPerLength && !isPerMile ? 0 : ODD,
      words: 'the value is per mile',
    },
    {
      code: 'per-km',
      key: '',
      factor: KM_PER_MILE,
      prior: isPerMile ? 0 : isPerLength ? -0.5 : ODD,
      words: 'the value is per kilometre and was taken as per mile',
    },
    {
      code: 'total',
      key: '',
      isWhole: true,
      // A total read as per mile has been divided by 1.609 on its way to per km already.
      factor: isPerMile ? KM_PER_MILE / lengthKm : 1 / lengthKm,
      prior: isPerLength ? 0 : ODD,
      words: () => `the value is that of the whole line of ${total()}`,
    },
    {
      code: 'per-length',
      key: '',
      isWhole: true,
      factor: lengthKm,
      prior: isPerLength ? -1 : 0,
      words: () => `the value is per kilometre and was taken as that of the whole line of ${total()}`,
    },
  ];
}

function chargingSlips(target: Target, { frequencyHz }: Problem): FactorSlip[] {
  const nanofarads = 2 * Math.PI * frequencyHz * 1e-3;
  const isFarads = target.value.unit.includes('F/');
  return [
    { code: 'half-charging', key: '', factor: 2, prior: 0, words: 'it is one leg of the pi' },
    { code: 'double-charging', key: '', factor: 0.5, prior: -0.3, words: 'the charging was counted twice' },
    {
      code: 'capacitance',
      key: 'nF',
      factor: nanofarads,
      prior: isFarads ? ODD : -0.3,
      words: 'the value is a capacitance in nF and was taken as µS',
    },
    {
      code: 'capacitance',
      key: 'uS',
      factor: 1 / nanofarads,
      prior: isFarads ? -0.3 : ODD,
      words: 'the value is a susceptance in µS and was taken as nF',
    },
  ];
}

function baseSlips(target: Target, problem: Problem): FactorSlip[] {
  const unit = target.value.unit;
  const isPerUnit = unit === 'pu' || unit === '%';
  const filedMva = target.value.baseMva ?? 100;
  const filedKv = target.value.baseKv ?? problem.nominalVoltageKv;
  const price = isPerUnit ? 0 : -2;
  const isSusceptance = isShunt(target.parameter);
  const bases = BASES_MVA.filter((mva) => mva !== filedMva);
  const voltages = problem.classesKv.filter((kv) => Math.abs(kv / filedKv - 1) > 1e-6);
  const power = bases.map((mva): FactorSlip => ({
    code: 'base-mva',
    key: String(mva),
    factor: isSusceptance ? mva / filedMva : filedMva / mva,
    prior: price - Math.log(bases.length),
    words: () => `the per-unit base is ${withUnit(mva, 'MVA')}, not ${withUnit(filedMva, 'MVA')}`,
  }));
  const voltage = voltages.map((kv): FactorSlip => ({
    code: 'base-kv',
    key: String(kv),
    factor:
      isSusceptance && unit !== 'Mvar' ? (filedKv / kv) ** 2 : (kv / filedKv) ** (unit === 'Mvar' ? -2 : 2),
    prior: price - 0.3 - Math.log(Math.max(1, voltages.length)),
    words: () => `the per-unit base is ${withUnit(kv, 'kV')}, not ${withUnit(filedKv, 'kV')}`,
  }));
  return [...power, ...voltage, ...neutralSlips(isSusceptance !== (unit === 'Mvar'), price)];
}

function neutralSlips(isInverse: boolean, price: number): FactorSlip[] {
  return (['neutral', 'phase'] as const).map((key): FactorSlip => {
    const isNeutral = key === 'neutral';
    return {
      code: 'phase-to-neutral-base',
      key,
      factor: isNeutral === isInverse ? 3 : 1 / 3,
      prior: Math.max(price, -1) - (isNeutral ? 0.3 : 0.8),
      words: isNeutral
        ? 'the base is the phase-to-neutral voltage'
        : 'the base was taken as phase to neutral and is phase to phase',
    };
  });
}

function shiftSlips(): FactorSlip[] {
  return SHIFTS.flatMap((power) =>
    [power, -power].map((shift): FactorSlip => ({
      code: 'decimal-shift',
      key: String(shift),
      factor: 10 ** shift,
      prior: -1 - Math.log(2 * SHIFTS.length) - (power === 6 ? 1 : 0),
      words:
        power === 1
          ? `the decimal point stands one place too far to the ${shift > 0 ? 'left' : 'right'}`
          : `it is ${figure(10 ** power)} times too ${shift > 0 ? 'small' : 'large'}: a decimal point or a metric prefix`,
    })),
  );
}
