import { publishedDates, publishedDifferenceDays } from '#tests/support/sky/published-dates.js';
import { independentScanDays, ownScanDays } from './dates-by-scan.js';
import { modelAgainstRuleDays, setModelAgainstRuleDays } from './model-and-rule.js';
import { ephemSunDays, erfaStarDays } from './places-in-the-sky.js';
import { type Accuracy, accuracyOf } from './statistics.js';

/** How the engine differs from each authority; all runs give the same numbers. */
export function accuracyReport(): Accuracy[] {
  const published = ['published-dates.csv', 'further-dates.csv'].flatMap(publishedDates);
  const model = modelAgainstRuleDays();
  return [
    accuracyOf('published dates', published.map(publishedDifferenceDays)),
    accuracyOf('ERFA: places of stars', erfaStarDays()),
    accuracyOf('PyEphem: places of the Sun', ephemSunDays()),
    accuracyOf('independent scan (ERFA and PyEphem)', independentScanDays()),
    accuracyOf('plain scan of the tests', ownScanDays()),
    accuracyOf('model of visibility, same side', model.sameSide),
    accuracyOf('model of visibility, opposite side', model.oppositeSide),
    accuracyOf('model set by first mornings', setModelAgainstRuleDays()),
  ];
}
