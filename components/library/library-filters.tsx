import { Search } from 'lucide-react';
import { Button } from '@/components/ui/button';
import { lineClass } from '@/components/ui/field-class';
import { Labelled } from '@/components/ui/labelled';
import { type Option, SelectField } from '@/components/ui/select-field';
import { KIND_NAME } from '@/generators/contract';
import { VERDICT_WORDS } from '@/generators/report';

const ANY: Option = { value: '', label: 'any' };
const optionsOf = (names: Readonly<Record<string, string>>): Option[] => [
  ANY,
  ...Object.entries(names).map(([value, label]) => ({ value, label })),
];
const KINDS = optionsOf(KIND_NAME);
const VERDICTS = optionsOf(VERDICT_WORDS);
const SIZES = [
  ANY,
  ...[50, 100, 180, 250].map((edge) => ({ value: String(edge), label: `up to ${edge} mm` })),
];
const SORTS: readonly Option[] = [
  { value: 'worked', label: 'worked most often' },
  { value: 'favourites', label: 'most favourites' },
  { value: 'title', label: 'name' },
];
const NEWEST: readonly Option[] = [{ value: '', label: 'newest' }];
const BEST: readonly Option[] = [
  { value: '', label: 'best fit' },
  { value: 'newest', label: 'newest' },
];

export interface Chosen {
  readonly text?: string | undefined;
  readonly kind?: string | undefined;
  readonly material?: string | undefined;
  readonly verdict?: string | undefined;
  readonly fits?: number | undefined;
  readonly open: boolean;
  readonly favourites: boolean;
  readonly sort?: string | undefined;
}

function Tick({ name, checked, children }: { name: string; checked: boolean; children: string }) {
  return (
    <label className="inline-flex min-h-10 items-center gap-2 pointer-coarse:min-h-11">
      <input
        type="checkbox"
        name={name}
        value="yes"
        defaultChecked={checked}
        className="size-5 accent-petrol"
      />
      {children}
    </label>
  );
}

function Select({
  label,
  name,
  now,
  options,
}: {
  label: string;
  name: string;
  now: string;
  options: readonly Option[];
}) {
  return (
    <Labelled label={label}>
      {(id) => <SelectField id={id} name={name} defaultValue={now} options={options} />}
    </Labelled>
  );
}

/** What is searched for; a plain form, so that the address holds it and it works before any script has come. */
export function LibraryFilters({
  chosen,
  materials,
  member,
}: {
  chosen: Chosen;
  materials: readonly Option[];
  member: boolean;
}) {
  return (
    <search className="mt-6 block">
      <form className="grid gap-3" action="/library">
        <div className="flex gap-2">
          <Labelled label="Search the library" className="flex-1">
            {(id) => (
              <input
                id={id}
                name="text"
                type="search"
                maxLength={100}
                defaultValue={chosen.text}
                placeholder="battery hatch"
                className={`${lineClass} text-lg`}
              />
            )}
          </Labelled>
          <Button type="submit" look="ink" className="self-end">
            <Search aria-hidden="true" size={18} />
            Search
          </Button>
        </div>
        <div className="grid grid-cols-2 items-end gap-3 sm:flex sm:flex-wrap">
          <Select label="Kind" name="kind" now={chosen.kind ?? ''} options={KINDS} />
          <Select label="Plastic" name="material" now={chosen.material ?? ''} options={[ANY, ...materials]} />
          <Select label="Verdict" name="verdict" now={chosen.verdict ?? ''} options={VERDICTS} />
          <Select label="Longest edge" name="fits" now={String(chosen.fits ?? '')} options={SIZES} />
          <Select
            label="Order"
            name="sort"
            now={chosen.sort ?? ''}
            options={[...(chosen.text ? BEST : NEWEST), ...SORTS]}
          />
          <Tick name="open" checked={chosen.open}>
            Printable in the open
          </Tick>
          {member && (
            <Tick name="favourites" checked={chosen.favourites}>
              My favourites
            </Tick>
          )}
        </div>
      </form>
    </search>
  );
}
