import type { ComponentProps } from 'react';
import { pictureOfSet } from '@/components/charts/picture/pictureSources';
import { Cautions } from '@/components/layout/Cautions';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import type { SearchResult, SearchSettings } from '@/shared/calibration/search/types';
import type { TaskSet } from '@/shared/tasks/types';
import { BeforeAfterCard } from './BeforeAfterCard';
import { BestSetCard } from './BestSetCard';
import { EvaluationsCard } from './EvaluationsCard';
import { FlatnessCard } from './FlatnessCard';
import { MakeScenarioCard } from './MakeScenarioCard';

interface Props {
  head: Pick<ComponentProps<typeof Screen>, 'title' | 'crumbs' | 'badge'>;
  set: TaskSet;
  settings: SearchSettings;
  result: SearchResult;
}

/** What a search found: the best set, what it is worth, and how sharply the observations tell. */
export function SearchResults({ head, set, settings, result }: Props) {
  const { study, may } = useCurrentStudy();
  return (
    <Screen
      {...head}
      picture={pictureOfSet(study, set)}
      lead="A proposal. The best fit is not the truth: roughness that makes up for a wrong inflow or a missing bridge fits, too."
      side={
        <>
          {may('scenario.change') ? <MakeScenarioCard set={set} settings={settings} /> : null}
          <BeforeAfterCard before={result.before} after={result.after} />
        </>
      }
    >
      <BestSetCard settings={settings} result={result} />
      {settings.stretches.map((stretch, i) => (
        <FlatnessCard
          key={i}
          stretch={stretch}
          flatness={result.flatness[i]}
          best={result.best.factors[i]}
        />
      ))}
      <EvaluationsCard settings={settings} result={result} />
      <Cautions />
    </Screen>
  );
}
