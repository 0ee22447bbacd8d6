import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { bandSentence } from './band-words';
import { conditionsSentence } from './conditions-words';
import { packageSentence } from './package-words';
import { planeSentence } from './plane-words';
import { sourceSentence } from './source-words';
import type { SpecForm } from './spec-form';
import { startUpSentence } from './start-up-words';
import { budgetSentence, targetSentence } from './target-words';

/** What each group of the form comes to; empty where that cannot be said yet. */
export const sentencesOf = (form: SpecForm, setup: BoardSetup) => ({
  target: targetSentence(form),
  budget: budgetSentence(form),
  band: bandSentence(form),
  source: sourceSentence(form),
  planes: planeSentence(form, setup),
  package: packageSentence(form),
  startUp: startUpSentence(form),
  conditions: conditionsSentence(form),
});
