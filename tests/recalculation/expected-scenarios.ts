/** The parts of data/expected.json that checks read. It was computed by a separate script. */
import { readFileSync } from 'node:fs'

export interface ExpectedFit {
  Umin_um: number
  Umax_um: number
  smoothing_loss_um: number
  thermal_change_um: number
  L_eff_mm: number
  p_min_MPa: number
  p_max_20C_MPa: number
  T_cap_min_Nm: number
  F_cap_min_kN: number
  req_resultant_kN: number
  S_slip_min: number
  hub_vonMises_max_MPa: number
  hub_hoop_bore_MPa: number
  S_hub_yield: number
  S_shaft_yield: number
  od_growth_um: number
  T_join_C: number
  T_oven_C: number
  max_join_C: number
  press_force_max_kN: number
}
export interface ExpectedShaft {
  reactions_N: number[]
  bearing_slope_mrad: number[]
  mesh: { hub: string; x: number; deflection_um: number; slope_mrad: number }[]
  seat_edges: { x: number; d: number; M_Nm: number; T_Nm: number; n_fatigue: number }[]
  min_fatigue: number
}
interface ExpectedState {
  fits: Record<string, ExpectedFit>
  shaft?: ExpectedShaft
}
export interface BendingCase {
  reactions_N: number[]
  bearing_slope_mrad: number[]
  lobe_deflection_um: number[]
  M_max_Nm: number
}
export interface ExpectedScenarios {
  S1: {
    expected: {
      flawed: ExpectedState & { transient_S_slip_A: number }
      fixed: ExpectedState & { transient_S_slip: Record<string, number> }
    }
  }
  S2: {
    expected: {
      fixed: {
        lobe_20C: ExpectedFit
        lobe_110C: ExpectedFit
        flange_110C: ExpectedFit
        bending_cases: BendingCase[]
      }
    }
  }
  S3: { expected: { flawed: ExpectedState; fixed: ExpectedState } }
}

export const expectedScenarios = JSON.parse(
  readFileSync(new URL('./data/expected.json', import.meta.url), 'utf8'),
) as ExpectedScenarios
