import type { RandomStream } from '../../engine/random/randomStream.ts';

/**
 * A project drawn from every feature of the engine: all behaviours and ways of giving σ'p and k, seams,
 * closed ends, artesian and standing water, staged lifts with removal, widening, traffic, drains with smear and
 * well resistance, vacuum, both couplings, secondary compression. No number in it is uncertain. Ranges are
 * those of soft ground under embankments (common practice), wide enough for strains of 40 %.
 */
export function randomProject(random: RandomStream): Record<string, unknown> {
  const between = (low: number, high: number) => round(low + (high - low) * random.next());
  const spread = (low: number, high: number) => round(low * (high / low) ** random.next());
  const chance = (share: number) => random.next() < share;
  const whole = (low: number, high: number) => low + Math.floor(random.next() * (high - low + 1));

  const { soils, layers, depth, top } = ground({ between, spread, chance, whole });
  const waterDepth = chance(0.15) ? -between(0.2, 1) : between(0.2, 2);
  const stages = whole(1, 3);
  const crest = between(8, 24);
  const lifts: Record<string, unknown>[] = [];
  let date = 0;
  let height = 0;
  if (chance(0.15)) {
    lifts.push(lift('old bank', 6, between(0.8, 1.5), { standing: true, crest_centre_x_m: -8 }));
  }
  for (let stage = 1; stage <= stages; stage += 1) {
    const duration = spread(0.02, 0.6);
    const thickness = between(0.5, 4 / stages);
    lifts.push(
      lift(`stage ${stage}`, crest - 4 * height, thickness, {
        placing: { start_year: round(date), end_year: round(date + duration) },
        ...(chance(0.1) ? { length: { from_m: -between(0, 10) } } : {}),
      }),
    );
    height += thickness;
    date += duration + (chance(0.6) ? spread(0.1, 2) : 0);
  }
  if (chance(0.4)) {
    const placed = round(date + spread(0.02, 0.2));
    const removed = round(placed + spread(0.2, 3));
    lifts.push(
      lift('surcharge', Math.max(2, crest - 4 * height), between(0.5, 2), {
        placing: { start_year: round(date), end_year: placed },
        removal: { start_year: removed, end_year: round(removed + spread(0.01, 0.2)) },
      }),
    );
    date = removed + 0.3;
  }
  const drains = chance(0.35);
  const vacuum = drains && chance(0.3) && top !== 'stiff_poorly_draining';
  const handover = round(date + between(0.1, 1));
  const horizon = round(handover + spread(2, 60));
  const held = chance(0.5);

  function lift(name: string, width: number, thickness: number, more: Record<string, unknown>) {
    return {
      name,
      crest_centre_x_m: 0,
      crest_width_m: round(Math.max(1, width)),
      left_slope_h_per_v: between(1.5, 3),
      right_slope_h_per_v: between(1.5, 3),
      thickness_m: round(thickness),
      unit_weight_kN_m3: between(16, 21),
      ...more,
    };
  }
  return {
    format: 'slow-ground-project',
    version: 1,
    name: 'random project',
    soils,
    layers,
    water: { depth_m: waterDepth, base_excess_head_m: chance(0.2) ? between(-1.5, 1) : 0 },
    boundaries: { top: chance(0.85) ? 'drained' : 'closed', base: chance(0.5) ? 'drained' : 'closed' },
    fill: { lifts, held_to_level: held, submergence: chance(0.6), wide: chance(0.15) },
    ...(chance(0.4)
      ? {
          surface_loads: [
            {
              name: 'traffic',
              kind: 'traffic',
              pressure_kPa: between(5, 15),
              x1_m: -5,
              x2_m: 5,
              start_year: handover,
              ...(chance(0.3) ? { end_year: round(handover + 1) } : {}),
            },
          ],
        }
      : {}),
    ...(drains
      ? {
          drains: {
            pattern: chance(0.5) ? 'triangular' : 'square',
            spacing_m: between(1, 2.5),
            band: { width_mm: 100, thickness_mm: 4 },
            smear_ratio: between(1, 4),
            permeability_ratio: between(1, 4),
            ...(chance(0.5) ? { discharge_capacity_m3_per_year: spread(5, 500) } : {}),
            top_m: 0,
            foot_m: round(depth * between(0.4, 1)),
            installed_year: chance(0.8) ? 0 : between(0, 0.3),
          },
        }
      : {}),
    ...(vacuum ? { vacuum: { pressure_kPa: between(40, 80), start_year: 0, end_year: spread(0.3, 2) } } : {}),
    points: [
      { name: 'centre', x_m: 0 },
      { name: 'side', x_m: between(4, 16) },
    ],
    times: { handover_year: handover, horizon_year: horizon, output_years: [] },
    limits: [{ result: 'settlement_after_handover', point: 'centre', limit_mm: 100 }],
    sampling: { realisations: 100, seed: 1 },
    results: chance(0.3) ? { degree_of_consolidation: 0.9 } : {},
  };
}

interface Draws {
  between: (low: number, high: number) => number;
  spread: (low: number, high: number) => number;
  chance: (share: number) => boolean;
  whole: (low: number, high: number) => number;
}

function ground({ between, spread, chance, whole }: Draws) {
  const count = whole(1, 6);
  const soils: Record<string, unknown>[] = [];
  const layers: Record<string, unknown>[] = [];
  let depth = 0;
  for (let i = 0; i < count; i += 1) {
    const name = `layer ${i + 1}`;
    const isSoft = i === Math.floor(count / 2) || chance(0.6);
    const thickness = isSoft ? spread(1, 12) : spread(0.3, 3);
    if (isSoft) soils.push(soft(name, depth, depth + thickness));
    else if (chance(0.7)) {
      soils.push({
        name,
        behaviour: 'stiff_free_draining',
        unit_weight_kN_m3: between(17, 20),
        modulus_kPa: spread(1e4, 6e4),
      });
    } else {
      soils.push({
        name,
        behaviour: 'stiff_poorly_draining',
        unit_weight_kN_m3: between(17, 20),
        modulus_kPa: spread(5e3, 3e4),
        cv_m2_per_year: spread(2, 50),
      });
    }
    layers.push({ name, soil: name, thickness_m: thickness });
    depth = round(depth + thickness);
  }
  return { soils, layers, depth, top: soils[0].behaviour };

  function soft(name: string, top: number, base: number) {
    const voidRatio = between(0.9, 3.5);
    const index = round(voidRatio * between(0.25, 0.45));
    const kind = whole(1, 3);
    const upper = 15 + 6 * top + between(0, 20);
    return {
      name,
      behaviour: 'compressible',
      unit_weight_kN_m3: round(16.5 - 0.9 * (voidRatio - 1)),
      compression_index: index,
      recompression_ratio: between(0.08, 0.2),
      ...(chance(0.2) ? { swelling_ratio: between(0.05, 0.15) } : {}),
      initial_void_ratio: voidRatio,
      preconsolidation:
        kind === 1
          ? { ocr: between(1, 2) }
          : kind === 2
            ? { pop_kPa: between(0, 40) }
            : {
                profile: [
                  { depth_m: top, stress_kPa: round(upper) },
                  { depth_m: base, stress_kPa: round(upper + 6.5 * (base - top)) },
                ],
              },
      consolidation: chance(0.75)
        ? {
            cv_m2_per_year: spread(0.3, 10),
            ...(chance(0.3) ? { permeability_index: round(0.5 * voidRatio) } : {}),
          }
        : { k0_m_per_s: spread(3e-10, 1e-8) },
      ch_over_cv: between(1, 3),
      ...(chance(0.2) ? { pre_yield_permeability_factor: between(1.5, 6) } : {}),
      ...(chance(0.7) ? { secondary_ratio: between(0.02, 0.06) } : {}),
    };
  }
}

function round(value: number): number {
  return Number(value.toPrecision(5));
}
