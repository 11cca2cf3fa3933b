import { Button } from '@/components/ui/button';

/** A search by the address of the page, so that it works without a script and can be passed on. */
export const SearchBox = ({ label, value }: { label: string; value: string }) => (
  <search>
    <form className="flex items-end gap-2">
      <label className="grid gap-1 text-sm">
        <span className="text-muted">{label}</span>
        <input
          type="search"
          name="q"
          defaultValue={value}
          maxLength={100}
          className="h-10 w-56 max-w-full rounded-field border border-edge bg-sheet px-3 text-base hover:border-ink"
        />
      </label>
      <Button type="submit">Find</Button>
    </form>
  </search>
);
