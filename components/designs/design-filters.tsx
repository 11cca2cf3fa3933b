import { Search } from 'lucide-react';
import { Button } from '@/components/ui/button';
import { lineClass } from '@/components/ui/field-class';
import { Labelled } from '@/components/ui/labelled';
import { type Option, SelectField } from '@/components/ui/select-field';
import { VERDICT_WORDS } from '@/generators/report';

const ANY: Option = { value: '', label: 'any' };
const VERDICTS = Object.entries(VERDICT_WORDS).map(([value, label]) => ({ value, label }));

export interface Chosen {
  readonly search?: string | undefined;
  readonly family?: string | undefined;
  readonly verdict?: string | undefined;
  readonly deleted: boolean;
}

/** What the list is narrowed to; a plain form, so that the address holds it. */
export function DesignFilters({ chosen, families }: { chosen: Chosen; families: readonly Option[] }) {
  return (
    <search className="mt-6 block">
      <form className="flex flex-wrap items-end gap-3">
        <Labelled label="Name" className="min-w-48 flex-1">
          {(id) => (
            <input
              id={id}
              name="search"
              type="search"
              maxLength={80}
              defaultValue={chosen.search}
              className={lineClass}
            />
          )}
        </Labelled>
        <Labelled label="Part">
          {(id) => (
            <SelectField
              id={id}
              name="family"
              defaultValue={chosen.family ?? ''}
              options={[ANY, ...families]}
            />
          )}
        </Labelled>
        <Labelled label="Verdict">
          {(id) => (
            <SelectField
              id={id}
              name="verdict"
              defaultValue={chosen.verdict ?? ''}
              options={[ANY, ...VERDICTS]}
            />
          )}
        </Labelled>
        {chosen.deleted && <input type="hidden" name="deleted" value="yes" />}
        <Button type="submit">
          <Search aria-hidden="true" size={17} />
          Show
        </Button>
      </form>
    </search>
  );
}
