import { LOOKS, type Look } from '@/lib/look/css';
import { account as words } from '@/lib/text/en/pages';
import { Button } from '../ui/Button';
import { Choices } from '../ui/Choices';

const LABELS: Record<Look, string> = { device: words.lookDevice, light: words.lookLight, dark: words.lookDark };

/** Light, dark, or whatever the device says. */
export function LookForm({
  look,
  action,
}: {
  readonly look: Look;
  readonly action: (data: FormData) => Promise<void>;
}) {
  return (
    <form action={action} className="grid gap-3">
      <Choices
        kind="radio"
        name="look"
        legend={words.look}
        hideLegend
        choices={LOOKS.map((value) => ({ value, label: LABELS[value] }))}
        chosen={[look]}
      />
      <div>
        <Button type="submit">{words.lookSave}</Button>
      </div>
    </form>
  );
}
