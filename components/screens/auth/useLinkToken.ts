import { useLocalSearchParams } from 'expo-router';

/** The token of a one-time link. */
export function useLinkToken(): string {
  const { token } = useLocalSearchParams<{ token?: string }>();
  return token ?? '';
}
