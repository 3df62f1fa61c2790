import type { LoggedEdit } from '../../shared/contracts/edits';
import type { SpreadEditEntity } from '../entities/spread-edit-entity';

/** Loaded with its `user`. */
export const presentEdit = (edit: SpreadEditEntity): LoggedEdit => ({
  id: edit.id,
  revision: edit.revision,
  command: edit.command,
  userId: edit.userId,
  userName: edit.user?.name ?? null,
  at: edit.at.toISOString(),
  patch: edit.patch,
});
