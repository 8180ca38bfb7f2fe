import type { BatteryPort } from '../recorder/ports.ts';

interface BatteryNavigator {
  getBattery?(): Promise<{ readonly level: number; readonly charging: boolean }>;
}

/** The battery where the browser tells of it. */
export const battery: BatteryPort = {
  read: async () => {
    try {
      const manager = await (navigator as BatteryNavigator).getBattery?.();
      return manager === undefined ? null : { level: manager.level, charging: manager.charging };
    } catch {
      return null;
    }
  },
};
