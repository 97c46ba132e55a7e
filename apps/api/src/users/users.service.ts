import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource, type EntityManager, In, IsNull, Not } from 'typeorm';
import { Problem } from '../common/problem';
import { User } from './entities/user.entity';

export interface NewUser {
  name: string;
  email: string;
  passwordHash: string;
  emailConfirmed: boolean;
}

export function comparableEmail(email: string): string {
  return email.trim().toLowerCase();
}

@Injectable()
export class UsersService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async get(userId: string, manager: EntityManager = this.dataSource.manager): Promise<User> {
    const user = await manager.findOneBy(User, { id: userId });
    if (!user) throw Problem.notFound('person');
    return user;
  }

  /** The account that confirmed this address. */
  async findConfirmed(email: string, manager: EntityManager = this.dataSource.manager): Promise<User | null> {
    return manager.findOneBy(User, { email: comparableEmail(email), emailConfirmedAt: Not(IsNull()) });
  }

  /** The newest account that gave this address and has not confirmed it. */
  async findUnconfirmed(
    email: string,
    manager: EntityManager = this.dataSource.manager,
  ): Promise<User | null> {
    return manager.findOne(User, {
      where: { email: comparableEmail(email), emailConfirmedAt: IsNull() },
      order: { createdAt: 'DESC' },
    });
  }

  /** id → name, for lists that say who did something */
  async namesOf(userIds: string[]): Promise<Map<string, string>> {
    const users = await this.dataSource.manager.find(User, {
      where: { id: In([...new Set(userIds)]) },
      select: { id: true, name: true },
    });
    return new Map(users.map((user) => [user.id, user.name]));
  }

  async create(manager: EntityManager, user: NewUser): Promise<User> {
    return manager.save(
      User,
      manager.create(User, {
        name: user.name,
        email: comparableEmail(user.email),
        passwordHash: user.passwordHash,
        emailConfirmedAt: user.emailConfirmed ? new Date() : null,
      }),
    );
  }

  async rename(userId: string, name: string): Promise<void> {
    await this.dataSource.manager.update(User, { id: userId }, { name });
  }

  async setPassword(manager: EntityManager, userId: string, passwordHash: string): Promise<void> {
    await manager.update(User, { id: userId }, { passwordHash });
  }

  /** Whoever asks has proved to read `email`. It may meanwhile belong to another account. */
  async confirmEmail(manager: EntityManager, userId: string, email: string): Promise<void> {
    const holder = await this.findConfirmed(email, manager);
    if (holder && holder.id !== userId) {
      throw Problem.conflict(
        'email-in-use',
        'This address belongs to another account. Sign in with that one.',
      );
    }
    await manager.update(
      User,
      { id: userId },
      { email: comparableEmail(email), emailConfirmedAt: new Date() },
    );
  }

  /** Inviting people and sending orders asks for an address that is known to be read. */
  async requireConfirmedEmail(userId: string): Promise<User> {
    const user = await this.get(userId);
    if (!user.emailConfirmedAt) {
      throw Problem.forbidden(
        'email-not-confirmed',
        'Confirm your e-mail address first: open the link in the mail you got.',
      );
    }
    return user;
  }
}
