import { useState } from 'react';
import { signOut } from '../shared/api';
import { asProblem } from '../shared/problem';
import { useAwake } from '../shared/use-awake';

/** The way out, in the top bar of every page. */
export function SignOut() {
  const awake = useAwake();
  const [problem, setProblem] = useState<string | null>(null);
  async function leave(): Promise<void> {
    try {
      await signOut();
      window.location.assign('/');
    } catch (error) {
      setProblem(asProblem(error).message);
    }
  }
  return (
    <>
      <button type="button" className="act-text text-note" disabled={!awake} onClick={leave}>
        Sign out
      </button>
      {problem && (
        <p role="alert" className="fault">
          {problem}
        </p>
      )}
    </>
  );
}
