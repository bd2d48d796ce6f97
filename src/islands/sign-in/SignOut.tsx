import { useState } from 'react';
import { signOut } from '../shared/api';
import { asProblem } from '../shared/problem';

/** The way out, in the top bar of every page. */
export function SignOut() {
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
      <button type="button" className="act-text text-note" onClick={leave}>
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
