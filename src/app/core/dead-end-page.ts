import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Empty } from '../ui/empty';

@Component({
  selector: 'tw-not-found-page',
  imports: [Empty, MatButton, RouterLink],
  template: `
    <div class="tw-page">
      <h1 tabindex="-1" class="tw-hidden">Nothing here</h1>
      <tw-empty title="There is nothing at this address" text="It may have moved, or the link was cut short.">
        <a matButton="outlined" routerLink="/">To the start</a>
      </tw-empty>
    </div>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotFoundPage {}

@Component({
  selector: 'tw-not-allowed-page',
  imports: [Empty, MatButton, RouterLink],
  template: `
    <div class="tw-page">
      <h1 tabindex="-1" class="tw-hidden">Not allowed</h1>
      <tw-empty
        title="Your role does not open this page"
        text="If you need it for your work, ask the administrator of the practice."
      >
        <a matButton="outlined" routerLink="/">To the start</a>
      </tw-empty>
    </div>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NotAllowedPage {}
