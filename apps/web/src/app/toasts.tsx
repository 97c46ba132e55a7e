import { Toaster } from 'sonner';
import { useTheme } from '@/lib/theme.ts';

/** Short words about what was done, at the foot of the page. */
export function Toasts() {
  const theme = useTheme((state) => state.choice);
  return (
    <Toaster
      theme={theme}
      position="bottom-center"
      toastOptions={{
        unstyled: true,
        classNames: {
          toast: 'flex w-full items-start gap-3 rounded-md bg-ink px-4 py-3 text-sm text-paper shadow-slip',
          actionButton: 'ml-auto shrink-0 font-semibold underline underline-offset-4',
        },
      }}
    />
  );
}
