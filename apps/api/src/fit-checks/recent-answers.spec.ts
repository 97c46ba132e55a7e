import { describe, expect, it } from '@jest/globals';
import { digest, RecentAnswers } from './recent-answers';

describe('recent answers', () => {
  it('keep so many, and forget the one unused longest', () => {
    const answers = new RecentAnswers<number>(2);
    answers.set('a', 1);
    answers.set('b', 2);
    expect(answers.get('a')).toBe(1);
    answers.set('c', 3);
    expect(['a', 'b', 'c'].map((key) => answers.get(key))).toEqual([1, undefined, 3]);
  });

  it('are found by the content that was asked about', () => {
    expect(digest({ a: [1] })).toBe(digest({ a: [1] }));
    expect(digest({ a: [1] })).not.toBe(digest({ a: [2] }));
  });
});
