import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import type { SignUp } from '../../shared/contracts/accounts';
import { AppError } from '../../shared/errors';
import type { StudioId } from '../../shared/model/ids';
import type { Role } from '../../shared/model/people';
import { TRIM_SETTINGS_INCH } from '../../shared/model/trim-settings';
import { MembershipEntity } from '../entities/membership-entity';
import { StudioEntity } from '../entities/studio-entity';
import { UserEntity } from '../entities/user-entity';
import { isDuplicateKey } from './database-errors';
import { hashPassword, verifyPassword } from './passwords';

interface Deps {
  readonly dataSource: DataSource;
  readonly now: () => Date;
  readonly studioQuotaBytes: number;
  readonly accountQuotaBytes: number;
  /** E-mail addresses of accounts that nobody can use: their passwords are public. */
  readonly closedAccounts: ReadonlySet<string>;
}

type NewAccount = Pick<SignUp, 'email' | 'password' | 'name'>;

export class AccountService {
  constructor(private readonly deps: Deps) {}

  /**
   * Makes the account, a studio and the ownership of it, or none of them.
   *
   * @throws AppError('already-exists') for an address that has an account.
   */
  async signUp({ email, password, name, studioName }: SignUp): Promise<UserEntity> {
    const { dataSource, now, studioQuotaBytes } = this.deps;
    const user = await this.build({ email, password, name });
    const createdAt = now();
    const studio = {
      id: randomUUID(),
      name: studioName,
      unit: 'in' as const,
      tolerance: TRIM_SETTINGS_INCH.tolerance,
      finestMark: TRIM_SETTINGS_INCH.finestMark,
      hidden: false,
      bytesUsed: 0,
      bytesQuota: studioQuotaBytes,
      createdAt,
    };
    await dataSource.transaction(async (manager) => {
      await insertAccount(manager, user);
      await manager.insert(StudioEntity, studio);
      await manager.insert(MembershipEntity, { studioId: studio.id, userId: user.id, role: 'owner', createdAt });
    });
    return user;
  }

  /** Makes an account as a member of a studio that is there. @throws AppError('already-exists'). */
  async addMember(studioId: StudioId, role: Role, account: NewAccount): Promise<UserEntity> {
    const user = await this.build(account);
    await this.deps.dataSource.transaction(async (manager) => {
      await insertAccount(manager, user);
      await manager.insert(MembershipEntity, { studioId, userId: user.id, role, createdAt: user.createdAt });
    });
    return user;
  }

  private async build({ email, password, name }: NewAccount): Promise<UserEntity> {
    const { dataSource, now, accountQuotaBytes } = this.deps;
    return dataSource.manager.create(UserEntity, {
      id: randomUUID(),
      email,
      name,
      passwordHash: await hashPassword(password),
      bytesUsed: 0,
      bytesQuota: accountQuotaBytes,
      createdAt: now(),
    });
  }

  /** The account that both belong to, or null; takes the same time either way. */
  async verify(email: string, password: string): Promise<UserEntity | null> {
    const user = await this.deps.dataSource.manager.findOneBy(UserEntity, { email });
    const matches = await verifyPassword(user?.passwordHash ?? null, password);
    return matches ? this.unlessClosed(user) : null;
  }

  /** Null where there is no such account that can be used. */
  async find(id: string): Promise<UserEntity | null> {
    return this.unlessClosed(await this.deps.dataSource.manager.findOneBy(UserEntity, { id }));
  }

  private unlessClosed(user: UserEntity | null): UserEntity | null {
    return user && !this.deps.closedAccounts.has(user.email) ? user : null;
  }

  /** @throws AppError('unauthenticated') when the account is gone. */
  async get(id: string): Promise<UserEntity> {
    const user = await this.find(id);
    if (!user) throw new AppError('unauthenticated');
    return user;
  }
}

/** @throws AppError('already-exists') for an address that has an account. */
async function insertAccount(manager: EntityManager, user: UserEntity): Promise<void> {
  try {
    await manager.insert(UserEntity, user);
  } catch (error) {
    if (isDuplicateKey(error)) throw new AppError('already-exists', { what: 'account' });
    throw error;
  }
}
