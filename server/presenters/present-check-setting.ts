import type { CheckSetting } from '../../shared/contracts/check-settings';
import type { CheckSettingEntity } from '../entities/check-setting-entity';

export const presentCheckSetting = ({ checkId, muted, thresholds }: CheckSettingEntity): CheckSetting => ({ checkId, muted, thresholds: { ...thresholds } });
