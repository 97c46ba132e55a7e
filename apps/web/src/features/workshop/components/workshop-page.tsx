import { Notice } from '@/components/notice.tsx';
import { PageHeading } from '@/components/page-heading.tsx';
import { PaleBars } from '@/components/loading.tsx';
import { RuleHeading } from '@/components/rule-heading.tsx';
import { usePageTitle } from '@/lib/page-title.ts';
import { sayProblem } from '@/lib/problem.ts';
import { useWorkshop, useWorkshopSettings } from '@/lib/workshop.ts';
import { CushionSettings } from '../cushions/cushion-settings.tsx';
import { ConfidenceForm } from './confidence-form.tsx';
import { Members } from './members.tsx';
import { SettingsForm } from './settings-form.tsx';
import { Upholsterers } from './upholsterers.tsx';

export function WorkshopPage() {
  const workshop = useWorkshop();
  usePageTitle(`Workshop, ${workshop.name}`);
  const settings = useWorkshopSettings(workshop.id);
  return (
    <div className="page">
      <PageHeading above="Workshop" title={workshop.name} />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-14 gap-y-10 desk:grid-cols-[minmax(0,1fr)_26rem]">
        <div className="grid grid-cols-[minmax(0,1fr)] gap-10">
          <Members workshop={workshop} />
          <Upholsterers workshop={workshop} />
          <CushionSettings workshop={workshop} />
        </div>
        <div className="grid grid-cols-[minmax(0,1fr)] gap-10">
          <section>
            <RuleHeading className="mb-4">Title block and paper</RuleHeading>
            {settings.isPending && <PaleBars words="Loading the workshop" />}
            {settings.isError && <Notice tone="wont">{sayProblem(settings.error)}</Notice>}
            {settings.data && <SettingsForm workshop={settings.data} canChange={workshop.isOwner} />}
          </section>
          {settings.data && (
            <section>
              <RuleHeading className="mb-4">How sure a verdict is</RuleHeading>
              <ConfidenceForm workshop={settings.data} canChange={workshop.isOwner} />
            </section>
          )}
        </div>
      </div>
    </div>
  );
}
