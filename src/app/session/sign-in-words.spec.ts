import { HttpErrorResponse, HttpHeaders } from '@angular/common/http';
import { PROBLEM } from '@shared/contracts/problem-types';
import { ServerProblem } from '../server/server-problem';
import { signInWords } from './sign-in-words';

describe('signInWords', () => {
  const tooMany = (wait?: string): string =>
    signInWords(
      ServerProblem.of(
        new HttpErrorResponse({
          status: 429,
          error: { type: PROBLEM.tooManyAttempts, title: 'Too many', status: 429 },
          headers: new HttpHeaders(wait === undefined ? {} : { 'Retry-After': wait }),
        }),
      ),
    );

  it('says how long to wait, in seconds or minutes', () => {
    expect(tooMany('90')).toContain('90 seconds');
    expect(tooMany('91')).toContain('2 minutes');
    expect(tooMany('0')).toContain('Wait a while');
    expect(tooMany()).toContain('Wait a while');
  });

  it('does not blame the person for a fault of the app', () => {
    expect(signInWords(new Error('x'))).toContain('here in the app');
  });
});
