import { useLocalSearchParams, useRouter } from 'expo-router';
import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { Field } from '@/features/ui/field';
import { measure } from '@/features/ui/tokens';

const PAUSE_MS = 300;

/** A part of the page's address, so that a search can be reloaded, shared and gone back to. */
export function useAddressPart(name: string): [string, (value: string) => void] {
  const params = useLocalSearchParams<Record<string, string>>();
  const router = useRouter();
  return [params[name] ?? '', (value) => router.setParams({ [name]: value || undefined })];
}

interface SearchFieldProps {
  /** Tells the searches of screens that stand on one page apart: "rack-search". */
  name: string;
  label: string;
  hint?: string;
  maxLength: number;
}

/** Searches while typing pauses; the words stand in the page's address as `search`. */
export function SearchField({ name, label, hint, maxLength }: SearchFieldProps) {
  const [search, setSearch] = useAddressPart('search');
  const [text, setText] = useState(search);
  const [sent, setSent] = useState(search);
  const [seen, setSeen] = useState(search);
  // Going back in the browser changes the address, and the field follows.
  if (search !== seen) {
    setSeen(search);
    if (search !== sent) {
      setSent(search);
      setText(search);
    }
  }
  const send = (words: string) => {
    setSent(words);
    setSearch(words);
  };
  useEffect(() => {
    const words = text.trim();
    if (words === sent) return;
    const timer = setTimeout(() => send(words), PAUSE_MS);
    return () => clearTimeout(timer);
  });
  return (
    <View style={styles.search}>
      <Field
        name={name}
        label={label}
        hint={hint}
        value={text}
        onChangeText={setText}
        onSubmit={() => send(text.trim())}
        inputMode="search"
        maxLength={maxLength}
      />
    </View>
  );
}

const styles = StyleSheet.create({ search: { width: '100%', maxWidth: measure.form } });
