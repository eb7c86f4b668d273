import { z } from 'zod';

/** Small settings of this device, kept in AsyncStorage; a field unknown or broken falls back. */
export const SettingsSchema = z.object({
  theme: z.enum(['device', 'day', 'lamp']).catch('device'),
  bladeMm: z.union([z.literal(18), z.literal(28), z.literal(45), z.literal(60)]).catch(45),
  cap: z.int().min(1).max(16).nullable().catch(null), // null: the blade's cautious cap
  under18: z.boolean().catch(false), // someone under 18 cuts here
  leftHanded: z.boolean().catch(false),
  haptics: z.boolean().catch(true),
  click: z.boolean().catch(false),
  spokenCount: z.boolean().catch(false),
});
export type Settings = z.output<typeof SettingsSchema>;
export const DEFAULT_SETTINGS: Settings = SettingsSchema.parse({});
