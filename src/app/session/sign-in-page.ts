import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { NonNullableFormBuilder, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { Router } from '@angular/router';
import { type User } from '@shared/contracts/session';
import { ProblemError } from '../api-client/problem-error';
import { Session } from './session';

/** Where each role begins its day. */
function homeOf(user: User): string {
  if (user.company.kind === 'market') return '/market';
  if (user.company.kind === 'dealer') return user.roles.includes('dealer-admin') ? '/money' : '/bench';
  if (user.roles.includes('accounts')) return '/receivables';
  if (user.roles.includes('plant')) return '/plant';
  return '/orders';
}

@Component({
  selector: 'app-sign-in-page',
  imports: [ReactiveFormsModule, MatFormFieldModule, MatInput, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="sy-page narrow">
      <h1>Sign in</h1>
      @if (ended()) {
        <p class="sy-note" role="status">Your session has ended. Sign in again and you come back to where you were.</p>
      }
      <form [formGroup]="form" (ngSubmit)="signIn()">
        <mat-form-field appearance="outline">
          <mat-label>E-mail</mat-label>
          <input matInput type="email" formControlName="email" autocomplete="username" required />
          <mat-error>Enter your e-mail address.</mat-error>
        </mat-form-field>
        <mat-form-field appearance="outline">
          <mat-label>Password</mat-label>
          <input matInput type="password" formControlName="password" autocomplete="current-password" required />
          <mat-error>Enter your password.</mat-error>
        </mat-form-field>
        @if (problem(); as text) {
          <p class="sy-problem" role="alert">{{ text }}</p>
        }
        <button matButton="filled" type="submit" [disabled]="busy()">{{ busy() ? 'Signing in…' : 'Sign in' }}</button>
      </form>
    </div>
  `,
  styles: `
    .narrow {
      max-width: 420px;
    }
    form {
      display: grid;
      gap: 8px;
      margin-top: 20px;
    }
    button {
      margin-top: 8px;
    }
  `,
})
export class SignInPage {
  readonly then = input<string>();
  readonly ended = input<string>();
  private readonly session = inject(Session);
  private readonly router = inject(Router);
  protected readonly form = inject(NonNullableFormBuilder).group({
    email: ['', [Validators.required]],
    password: ['', [Validators.required]],
  });
  protected readonly problem = signal('');
  protected readonly busy = signal(false);

  protected async signIn(): Promise<void> {
    if (this.form.invalid || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.busy.set(true);
    this.problem.set('');
    try {
      const { email, password } = this.form.getRawValue();
      const user = await this.session.signIn(email, password);
      const then = this.then();
      // Only places of our own: never an address somebody else put into the link.
      await this.router.navigateByUrl(then && /^\/(?!\/)/.test(then) ? then : homeOf(user));
    } catch (error) {
      this.problem.set(error instanceof ProblemError ? error.detail : 'Sealyard cannot be reached. Check the connection and try again.');
    } finally {
      this.busy.set(false);
    }
  }
}
