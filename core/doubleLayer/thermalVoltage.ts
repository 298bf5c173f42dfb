import { BOLTZMANN_J_K, ELEMENTARY_CHARGE_C } from '../constants';

/** kT/e [V]: 25.7 mV at 25 °C. Potentials divided by it are called reduced in this room, and carry no unit. */
export const thermalVoltage = (temperature_K: number): number => (BOLTZMANN_J_K * temperature_K) / ELEMENTARY_CHARGE_C;
