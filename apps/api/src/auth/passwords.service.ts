import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';

/** argon2id, which is the library's default kind */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

@Injectable()
export class PasswordsService {
  private readonly nobodysHash = hash('nobody has this password', COST);

  hash(password: string): Promise<string> {
    return hash(password, COST);
  }

  /** Takes the same time for nobody, so that the wait does not tell whether an account exists. */
  async matches(storedHash: string | null, password: string): Promise<boolean> {
    const right = await verify(storedHash ?? (await this.nobodysHash), password).catch(() => false);
    return storedHash !== null && right;
  }
}
