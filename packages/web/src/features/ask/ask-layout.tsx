import type { ReactNode } from 'react';
import { PageCard } from '../../components/page-card';
import classes from './ask-layout.module.css';

interface AskLayoutProps {
  readonly summary: ReactNode;
  readonly where: ReactNode;
  readonly keptAt: string | null;
  readonly trouble: ReactNode;
  /** Null where the trouble is not about a hole. */
  readonly hole: { readonly form: ReactNode; readonly drawing: ReactNode; readonly check: ReactNode } | null;
  readonly photos: ReactNode;
  readonly metBefore: ReactNode;
  readonly send: ReactNode;
  /** What can be done with the draft besides. */
  readonly foot: ReactNode;
  readonly onSubmit: () => void;
  /** Handed over: what is on its way is not changed under way. */
  readonly isLocked: boolean;
}

/** The form on the left, what comes of it on the right and always in view; on a phone one below the other. */
export function AskLayout(props: AskLayoutProps): ReactNode {
  const { hole } = props;
  return (
    <form
      className={classes['page']}
      noValidate
      aria-label="Ask"
      onKeyDown={(event) => {
        // Enter in a field is a habit of numbers, and must not put half a question to the mentors.
        if (event.key === 'Enter' && event.target instanceof HTMLInputElement) event.preventDefault();
      }}
      onSubmit={(event) => {
        event.preventDefault();
        props.onSubmit();
      }}
    >
      <h1 className="unseen">Ask</h1>
      {props.summary && <div className={classes['summary']}>{props.summary}</div>}
      <fieldset className={classes['form']} disabled={props.isLocked}>
        <PageCard
          title="1 · Where on the kit"
          aside={props.keptAt && `draft kept on this device, ${props.keptAt}`}
        >
          <div className={classes['body']}>{props.where}</div>
        </PageCard>
        <PageCard title="2 · What is wrong">
          <div className={classes['body']}>{props.trouble}</div>
        </PageCard>
        {hole && (
          <PageCard title="3 · Hole card" aside="what you measured; leave blank what you could not">
            <div className={classes['body']}>{hole.form}</div>
          </PageCard>
        )}
        <PageCard title={hole ? '4 · Show it' : '3 · Show it'}>
          <div className={classes['body']}>{props.photos}</div>
        </PageCard>
        {props.foot}
      </fieldset>
      <div className={classes['beside']}>
        {hole && <PageCard title="Drawn to scale">{hole.drawing}</PageCard>}
        <div className={classes['outcome']}>
          {hole && <PageCard title="Checked as you type">{hole.check}</PageCard>}
          <PageCard title="Met before">{props.metBefore}</PageCard>
        </div>
        {props.send}
      </div>
    </form>
  );
}
