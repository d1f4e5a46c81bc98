import { changeMeSchema, type Me, meSchema } from '@rivetside/shared';
import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { ChoiceField, TextField } from '../../components/field';
import { api } from '../../lib/api';
import { meQuery, session } from '../../lib/session';
import { useSetUnits } from '../../lib/units';
import { Refusal, SendButton } from './form-parts';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

function zones(own: string): { value: string; label: string }[] {
  const known = Intl.supportedValuesOf('timeZone');
  const all = known.includes(own) ? known : [own, ...known];
  return all.map((value) => ({ value, label: value.replaceAll('_', ' ') }));
}

export function AboutYouForm({ me }: { readonly me: Me }): ReactNode {
  const [isKept, setKept] = useState(false);
  const setUnits = useSetUnits();
  const queryClient = useQueryClient();
  const { field, handleSubmit, isSending, refusal } = useFormOf({
    initial: { name: me.name, units: me.units, zone: me.zone },
    schema: changeMeSchema,
    send: async (typed) => {
      const changed = await api.patch('/me', { body: typed, answer: meSchema });
      queryClient.setQueryData(meQuery.queryKey, session.changed(changed));
      setUnits(changed.units);
      setKept(true);
    },
  });
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit} onChange={() => setKept(false)}>
      <Refusal>{refusal}</Refusal>
      <TextField {...field('name')} label="Name" autoComplete="name" />
      <ChoiceField
        {...field('units')}
        label="Units"
        hint="Lengths are kept in inches and shown as you like; either may be typed anywhere."
        choices={[
          { value: 'inch', label: 'inch' },
          { value: 'mm', label: 'millimetre' },
        ]}
      />
      <ChoiceField {...field('zone')} label="Time zone" choices={zones(me.zone)} />
      <SendButton isSending={isSending}>Keep</SendButton>
      <Kept isKept={isKept}>Kept.</Kept>
    </form>
  );
}

export function Kept({
  isKept,
  children,
}: {
  readonly isKept: boolean;
  readonly children: ReactNode;
}): ReactNode {
  return <div aria-live="polite">{isKept && <p className={classes['done']}>{children}</p>}</div>;
}
