import { compare, hash, hashSync } from 'bcryptjs';

export const BCRYPT_COST = 11;

export class Passwords {
  /** Compared against when there is no such person, so that the answer takes as long. */
  private readonly nobody: string;

  constructor(private readonly cost: number = BCRYPT_COST) {
    this.nobody = hashSync('nobody has this password', cost);
  }

  hash(password: string): Promise<string> {
    return hash(password, this.cost);
  }

  /** False for a missing hash, after the same work. bcrypt reads 72 bytes, so longer ones never match. */
  async matches(password: string, passwordHash: string | null): Promise<boolean> {
    const fits = Buffer.byteLength(password) <= 72;
    const same = await compare(fits ? password : 'too long', passwordHash ?? this.nobody);
    return same && fits && passwordHash !== null;
  }
}
