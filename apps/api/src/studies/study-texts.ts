import type { EntityManager } from 'typeorm';
import type { KeptRow } from '../common/kept-text';
import { changedSummary, changedWords } from '../populations/population-texts';
import { Study } from './entities/study.entity';
import type { StudyQuestion } from './study-question';

type Change = (text: string) => string;

/** The words of own populations as the studies of a workshop keep them. To be rewritten, nobody counts meanwhile. */
export async function* studyTexts(
  manager: EntityManager,
  workshopId: string,
  { toRewrite }: { toRewrite: boolean },
): AsyncGenerator<KeptRow> {
  const studies = manager
    .createQueryBuilder(Study, 'study')
    .select(['study.id', 'study.population', 'study.question'])
    .innerJoin('study.set', 'set')
    .innerJoin('set.production', 'production')
    .where('production.workshopId = :workshopId', { workshopId })
    .andWhere(`study.population->>'kind' = 'own'`)
    .orderBy('study.startedAt')
    .addOrderBy('study.id');
  if (toRewrite) studies.setLock('pessimistic_write', undefined, ['study']);
  for (const { id, population, question } of await studies.getMany()) {
    yield {
      texts: [
        { where: 'Study, name of its population', text: population.name },
        { where: 'Study, source of its population', text: population.source },
      ],
      rewrite: (change) =>
        manager.update(
          Study,
          { id },
          {
            population: { ...population, ...changedWords(population, change) },
            question: question && changedQuestion(question, change),
          },
        ),
    };
  }
}

/** A study that is not counted yet holds the population once more. */
function changedQuestion(question: StudyQuestion, change: Change): StudyQuestion {
  const { crowd } = question;
  if (crowd.kind !== 'own') return question;
  const summary = changedSummary(crowd.summary, change);
  return { ...question, crowd: { ...crowd, ...changedWords(crowd, change), summary } };
}
