import { Toaster } from 'sonner';

/** Short words about what was done, at the foot of the page; in the page's own colours, light or dark. */
export function Toasts() {
  return (
    <Toaster
      position="bottom-center"
      toastOptions={{
        unstyled: true,
        classNames: {
          toast:
            'font-sans flex w-full items-start gap-3 rounded-md bg-ink px-4 py-3 text-sm text-paper shadow-slip',
          actionButton: 'ml-auto shrink-0 font-semibold underline underline-offset-4',
        },
      }}
    />
  );
}
