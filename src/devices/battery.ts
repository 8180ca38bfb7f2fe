import type { BatteryPort } from '../recorder/ports.ts';

interface WithBattery {
  getBattery?(): Promise<{ readonly level: number; readonly charging: boolean }>;
}

export const battery: BatteryPort = {
  read: async () => {
    try {
      const found = await (navigator as WithBattery).getBattery?.();
      return found === undefined ? null : { level: found.level, charging: found.charging };
    } catch {
      return null;
    }
  },
};
