import { createContext } from 'preact';
import { useContext } from 'preact/hooks';
import type { AppServices } from '../app/app-services.ts';

export const AppContext = createContext<AppServices | null>(null);

/** The services that main made. */
export function useApp(): AppServices {
  const services = useContext(AppContext);
  if (services === null) throw new RangeError('useApp needs AppContext.Provider above it');
  return services;
}
