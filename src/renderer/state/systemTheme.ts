import { onScopeDispose, ref, type Ref } from 'vue'

/** The theme that the system asks for, followed as it changes. */
export function useSystemTheme(): Ref<'light' | 'dark'> {
  const query = window.matchMedia('(prefers-color-scheme: dark)')
  const theme = ref<'light' | 'dark'>(query.matches ? 'dark' : 'light')
  const follow = (): void => void (theme.value = query.matches ? 'dark' : 'light')
  query.addEventListener('change', follow)
  onScopeDispose(() => query.removeEventListener('change', follow))
  return theme
}
