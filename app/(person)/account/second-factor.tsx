'use client';

import Image from 'next/image';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import {
  beginSecondFactorAction,
  confirmSecondFactorAction,
  endSecondFactorAction,
} from './actions';
import { proofFields } from './proof-fields';

/** On or off; turning it on goes over a drawing to scan, a first code and the recovery codes. */
export function SecondFactor({ isOn, unusedCodes }: { isOn: boolean; unusedCodes: number }) {
  const router = useRouter();
  const [begun, setBegun] = useState<{ secret: string; drawing: string }>();
  const [codes, setCodes] = useState<readonly string[]>();

  if (codes !== undefined) {
    return (
      <RecoveryCodes
        codes={codes}
        onDone={() => {
          setCodes(undefined);
          setBegun(undefined);
          router.refresh();
        }}
      />
    );
  }
  if (isOn) {
    return (
      <>
        <p className="mt-2 max-w-sm">
          On. {unusedCodes} of 10 recovery codes are left. To get new ones, turn it off and on
          again.
        </p>
        <SimpleForm
          fields={proofFields(true)}
          submit={async ({ password = '', code = '' }) => {
            const answer = await endSecondFactorAction({ password, code });
            if (answer.ok) router.refresh();
            return answer;
          }}
          label="Turn it off"
          busyLabel="Turning off…"
          failure="Still on"
        />
      </>
    );
  }
  if (begun !== undefined) {
    return (
      <>
        <p className="mt-2 max-w-sm">
          Scan this with an authenticator app, or type the key in. Then write the six figures it
          shows.
        </p>
        <Image
          src={begun.drawing}
          alt="The key as a drawing to scan"
          width={220}
          height={220}
          unoptimized
          className="mt-3 bg-white"
        />
        <p className="figure mt-2 break-all whitespace-normal">{begun.secret}</p>
        <SimpleForm
          fields={[{ name: 'code', label: 'Six figures', autoComplete: 'one-time-code' }]}
          submit={async ({ code = '' }) => {
            const answer = await confirmSecondFactorAction({ code });
            if (answer.ok) setCodes(answer.value);
            return answer;
          }}
          label="Turn it on"
          busyLabel="Checking…"
          failure="Not on yet"
        />
      </>
    );
  }
  return (
    <>
      <p className="mt-2 max-w-sm text-ink-soft">
        Off. With it, a stolen password alone opens nothing: signing in also asks for the figures
        your phone shows.
      </p>
      <SimpleForm
        fields={proofFields(false)}
        submit={async ({ password = '' }) => {
          const answer = await beginSecondFactorAction({ password, code: '' });
          if (answer.ok) setBegun(answer.value);
          return answer;
        }}
        label="Set it up"
        busyLabel="Setting up…"
        failure="Not set up"
      />
    </>
  );
}

function RecoveryCodes({ codes, onDone }: { codes: readonly string[]; onDone: () => void }) {
  return (
    <div role="status" className="mt-3 max-w-sm">
      <Notice tone="watch" title="It is on. Keep these codes">
        Each opens the account once if the phone is lost. They are shown only now.
      </Notice>
      <ul className="figure mt-3 grid grid-cols-2 gap-x-6 gap-y-1">
        {codes.map((code) => (
          <li key={code}>{code}</li>
        ))}
      </ul>
      <div className="mt-4 flex gap-3">
        <Button onClick={() => window.print()}>Print</Button>
        <Button shape="main" onClick={onDone}>
          I have kept them
        </Button>
      </div>
    </div>
  );
}
