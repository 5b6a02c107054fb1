import { TestBed } from '@angular/core/testing';
import { CopyButton } from './copy-button';
import { provideIcons } from './provide-icons';

async function copyWith(clipboard: { writeText(text: string): Promise<void> } | undefined): Promise<string> {
  Object.defineProperty(navigator, 'clipboard', { value: clipboard, configurable: true });
  TestBed.configureTestingModule({ providers: [provideIcons()] });
  const fixture = TestBed.createComponent(CopyButton);
  fixture.componentRef.setInput('text', 'A citation.');
  fixture.componentRef.setInput('label', 'Copy citation');
  fixture.detectChanges();
  (fixture.nativeElement as HTMLElement).querySelector('button')!.click();
  await new Promise((resolve) => setTimeout(resolve));
  fixture.detectChanges();
  return (fixture.nativeElement as HTMLElement).querySelector('[role="status"]')?.textContent ?? '';
}

it('copies the text and says so', async () => {
  const copied: string[] = [];
  const said = await copyWith({ writeText: (text) => Promise.resolve(void copied.push(text)) });
  expect(copied).toEqual(['A citation.']);
  expect(said).toBe('Copied');
});

it.each([
  ['refuses', { writeText: () => Promise.reject(new Error('denied')) }],
  ['has no clipboard here', undefined],
])('says when the browser %s', async (_, clipboard) => {
  expect(await copyWith(clipboard)).toBe('The browser does not allow copying here.');
});
