import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';

export function AuditFilter({ actions, value }: { actions: readonly string[]; value: string }) {
  const options = [{ value: '', label: 'Everything' }, ...actions.map((one) => ({ value: one, label: one }))];
  return (
    <search>
      <form className="flex items-end gap-2">
        <div className="grid gap-1 text-sm">
          <label htmlFor="audit-action" className="text-muted">
            What was done
          </label>
          <SelectField
            id="audit-action"
            name="action"
            options={options}
            defaultValue={value}
            className="w-56 text-base"
          />
        </div>
        <Button type="submit">Show</Button>
      </form>
    </search>
  );
}
