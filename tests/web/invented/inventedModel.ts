import type { Marginal } from '../../../engine/marginals/marginal.ts';
import type { Model } from '../../../engine/project/model.ts';
import type { UncertainNumber } from '../../../engine/project/uncertainNumber.ts';

/** A number of the invented model; the drawing reads nothing of a marginal but its median. */
export function number(value: number, label: string, unit = 'm', index = -1): UncertainNumber {
  return {
    name: label,
    label,
    unit,
    marginal: { kind: 'fixed', value } as unknown as Marginal,
    index,
    spread: null,
    keepsMean: true,
    source: { kind: 'judgement', text: '' },
    note: '',
  };
}

const always = { from: -Infinity, to: Infinity };
const period = (start: number, end: number) => ({
  start: number(start, 'start', 'year'),
  end: number(end, 'end', 'year'),
});

const cc = number(0.8, 'compression index of soft clay', '1', 0);
const ocr = number(1.4, 'overconsolidation ratio of soft clay', '1', 1);
const thickness = number(1, 'thickness of soft clay (factor on the borings)', '1', 2);

/** An invented approach embankment, shaped like the checked model; made by hand for tests of the page alone. */
export const inventedModel: Model = {
  name: 'Invented approach',
  notes: 'Invented for tests.',
  digest: '00000000000000000000000000000001',
  soils: [
    {
      behaviour: 'stiff_poorly_draining',
      name: 'crust',
      unitWeight: number(18, 'unit weight of crust', 'kN/m³'),
      modulus: number(8000, 'modulus of crust', 'kPa'),
      verticalCoefficient: number(5, 'c_v of crust', 'm²/year'),
      horizontalRatio: number(1, 'c_h/c_v of crust', '1'),
    },
    {
      behaviour: 'compressible',
      name: 'soft clay',
      unitWeight: number(15.5, 'unit weight of soft clay', 'kN/m³'),
      compressionIndex: cc,
      recompression: { given: 'ratio', number: number(0.1, 'Cr/Cc of soft clay', '1') },
      swelling: null,
      initialVoidRatio: number(1.8, 'initial void ratio of soft clay', '1'),
      preconsolidation: { kind: 'ocr', ocr },
      permeability: {
        kind: 'cv',
        verticalCoefficient: number(1, 'c_v of soft clay', 'm²/year'),
        permeabilityIndex: null,
      },
      horizontalRatio: number(2, 'c_h/c_v of soft clay', '1'),
      preYieldFactor: number(1, 'factor on k before yield', '1'),
      secondary: null,
    },
    {
      behaviour: 'stiff_free_draining',
      name: 'sand',
      unitWeight: number(19, 'unit weight of sand', 'kN/m³'),
      modulus: number(40000, 'modulus of sand', 'kPa'),
    },
  ],
  layers: [
    { name: 'crust', soil: 0, thickness: { kind: 'even', thickness: number(1.2, 'thickness of crust') } },
    {
      name: 'soft clay',
      soil: 1,
      thickness: { kind: 'borings', x: [-20, 0, 30], thickness: [3, 6.5, 10], factor: thickness },
    },
    {
      name: 'sand',
      soil: 2,
      thickness: { kind: 'borings', x: [-20, 0, 30], thickness: [9, 6, 3], factor: number(1, 'factor', '1') },
    },
  ],
  water: { depth: number(0.8, 'water level'), baseExcessHead: number(0, 'base head') },
  boundaries: { top: 'drained', base: 'drained' },
  lifts: [
    {
      name: 'embankment',
      crestCentre: 8,
      crestWidth: 40,
      leftSlope: 0,
      rightSlope: 2,
      thickness: number(5, 'thickness of embankment'),
      unitWeight: number(20, 'unit weight of fill', 'kN/m³'),
      standing: false,
      placing: period(0, 0.5),
      removal: null,
      outOfPlane: always,
    },
    {
      name: 'surcharge',
      crestCentre: 9,
      crestWidth: 32,
      leftSlope: 1.5,
      rightSlope: 1.5,
      thickness: number(2, 'thickness of surcharge'),
      unitWeight: number(19, 'unit weight of surcharge', 'kN/m³'),
      standing: false,
      placing: period(0.6, 0.8),
      removal: period(1.8, 1.9),
      outOfPlane: always,
    },
  ],
  surfaceLoads: [
    {
      name: 'traffic',
      traffic: true,
      pressure: number(10, 'traffic', 'kPa'),
      x1: -10,
      x2: 26,
      outOfPlane: always,
      start: number(2, 'start', 'year'),
      end: null,
    },
  ],
  drains: {
    pattern: 'triangular',
    spacing: 1.5,
    diameter: 0.066,
    smearRatio: number(2, 's', '1'),
    permeabilityRatio: number(2, 'k', '1'),
    dischargeCapacity: null,
    top: 0,
    foot: 9,
    installed: 0,
    from: -12,
    to: 38,
  },
  vacuum: null,
  couplings: { heldUntil: null, topUpUnitWeight: null, submergence: true },
  wideFill: false,
  secondary: { included: true, reductionFloor: 0.1, reductionExponent: 6 },
  points: [
    { name: 'Abutment', x: -14, fixed: true },
    { name: 'Near end', x: -8, fixed: false },
    { name: 'Far end', x: 20, fixed: false },
  ],
  pairs: [{ name: 'Abutment to near end', first: 0, second: 1 }],
  handover: 2,
  horizon: 30,
  outputTimes: [2, 10, 30],
  limits: [
    { name: 'Ride', result: 'settlement_after_handover', point: 2, pair: -1, value: 0.1, date: 2 },
    { name: 'Slab', result: 'slope_after_handover', point: -1, pair: 0, value: 1 / 200, date: 2 },
  ],
  modelFactors: {
    settlement: number(1, 'model factor on settlement', '1'),
    rate: number(1, 'model factor on rate', '1'),
  },
  sampling: { realisations: 1000, seed: 7 },
  results: { percentiles: [5, 25, 50, 75, 95], degreeOfConsolidation: null },
  inputs: [cc, ocr, thickness],
  correlations: [{ first: 0, second: 1, rank: -0.3 }],
  remarks: [],
};
