import type { Metadata } from 'next';
import { LivePreview } from '@/components/forms/house-style/live-preview';
import { formatInstant } from '@/lib/format/date';
import { CautionNote } from '@/components/ui/caution-note';
import { LinkButton } from '@/components/ui/link-button';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { STYLE_STATE_NAMES } from '@/lib/domain/house-style';
import { canActAsEditor } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import { describeSentences } from '@/lib/services/house-style/describe-sentences';
import { getStyle, type StyleView } from '@/lib/services/house-style/get-style';
import { ActButton } from '../_components/act-button';
import { ChangeList } from '../_components/change-list';
import { SendStyleBack } from '../_components/send-style-back';
import { StyleReading } from '../_components/style-reading';
import {
  bringUpToDateAction,
  putStyleInForceAction,
  sendStyleBackAction,
  takeUpStyleAction,
  withdrawStyleAction,
} from '../actions';

export const metadata: Metadata = { title: 'A version of house style' };

const ACTS: Record<StyleView['acts'][number]['act'], string> = {
  proposed: 'proposed it',
  'put-in-force': 'put it in force',
  'sent-back': 'sent it back',
  withdrawn: 'withdrew it',
};

export default async function StyleVersionPage({ params }: PageProps<'/house-style/[id]'>) {
  const { id } = await params;
  const { view, isEditor } = await deskPage((actor, ctx) => ({
    view: getStyle(actor, id, ctx),
    isEditor: canActAsEditor(actor),
  }));
  const zone = readEnv().LEADLINE_ZONE;
  const isOpen = view.state === 'draft' || view.state === 'proposed';
  return (
    <>
      <PageTitle
        crumbs={[{ label: 'House style', href: '/house-style' }]}
        title={view.number === null ? 'A version of house style' : `Version ${view.number}`}
        sub={`${STYLE_STATE_NAMES[view.state]}, ${formatInstant(view.inForceAt ?? view.updatedAt, zone, 'en-GB')}, by ${view.author ?? 'Leadline'}${view.second ? ` and ${view.second}` : ''}.`}
      />
      {isEditor && isOpen ? <NextBar actions={<Acts view={view} />}>{nextWords(view)}</NextBar> : null}
      {view.isBehind && isOpen ? (
        <CautionNote title="Another version came into force since this one was started.">
          <p>It is brought up to date by its author before it can be proposed or put in force.</p>
        </CautionNote>
      ) : null}
      {view.note ? <p className="my-3 max-w-prose">{view.note}</p> : null}
      <SectionHeading>
        What differs from {view.comparedWith ? `version ${view.comparedWith.number}` : 'before'}
      </SectionHeading>
      <ChangeList changes={view.changes} />
      {isEditor && isOpen ? (
        <>
          <SectionHeading>What it would change in what is live</SectionHeading>
          <LivePreview id={view.id} />
        </>
      ) : null}
      {view.acts.length > 0 ? (
        <>
          <SectionHeading>Who agreed to what</SectionHeading>
          <ol>
            {view.acts.map((act, at) => (
              <li key={at} className="border-b border-rule py-2">
                {act.person} {ACTS[act.act]}, {formatInstant(act.at, zone, 'en-GB')}.
                {act.comment ? <p className="max-w-prose text-soft">“{act.comment}”</p> : null}
              </li>
            ))}
          </ol>
          {view.hash ? (
            <p className="mt-2 text-13 text-soft wrap-anywhere">
              Agreed to as <code>{view.hash}</code>
            </p>
          ) : null}
        </>
      ) : null}
      {isOpen ? null : <StyleReading body={view.body} sentences={describeSentences(view.body).sentences} />}
    </>
  );
}

function nextWords(view: StyleView): string {
  if (view.isOwnProposal) return 'You proposed this version. It waits for another editor.';
  if (view.may.putInForce) return 'Read what differs, then put it in force or send it back with a reason.';
  if (view.may.takeUp) return 'Nobody has taken up this draft yet. Take it up to change and propose it.';
  if (view.may.write) return 'This is your draft.';
  return `${view.author ?? 'Another editor'} is writing this draft.`;
}

function Acts({ view }: { view: StyleView }) {
  const { id, version, may, hash } = view;
  const here = `/house-style/${id}`;
  return (
    <>
      {may.withdraw ? (
        <ActButton act={withdrawStyleAction} input={{ id, version }} label="Withdraw" to="/house-style" />
      ) : null}
      {may.takeUp ? (
        <ActButton
          act={takeUpStyleAction}
          input={{ id, version }}
          label="Take it up"
          tone="primary"
          to={`${here}/edit`}
        />
      ) : null}
      {may.write && view.isBehind ? (
        <ActButton act={bringUpToDateAction} input={{ id, version }} label="Bring up to date" to={here} />
      ) : null}
      {may.write ? (
        <LinkButton href={`${here}/edit`} tone="primary">
          Go on writing
        </LinkButton>
      ) : null}
      {may.sendBack && hash ? (
        <SendStyleBack id={id} hash={hash} isOwn={view.isOwnProposal} act={sendStyleBackAction} />
      ) : null}
      {may.putInForce ? (
        <ActButton
          act={putStyleInForceAction}
          input={{ id, hash }}
          label="Put in force"
          tone="primary"
          to={here}
        />
      ) : null}
    </>
  );
}
