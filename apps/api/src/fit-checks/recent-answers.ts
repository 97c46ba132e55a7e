import { createHash } from 'node:crypto';

/** Answers that take long, kept in memory by a digest of all that was asked; the one unused longest goes first. */
export class RecentAnswers<T> {
  private readonly answers = new Map<string, T>();

  /** @param most - answers kept, at least 1 */
  constructor(private readonly most: number) {}

  get(key: string): T | undefined {
    const answer = this.answers.get(key);
    if (answer !== undefined) this.set(key, answer);
    return answer;
  }

  set(key: string, answer: T): void {
    this.answers.delete(key);
    this.answers.set(key, answer);
    for (const oldest of this.answers.keys()) {
      if (this.answers.size <= this.most) break;
      this.answers.delete(oldest);
    }
  }
}

/** The same for the same content; the content cannot be read back from it. */
export const digest = (content: unknown): string =>
  createHash('sha256').update(JSON.stringify(content)).digest('base64');
