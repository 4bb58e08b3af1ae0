import { useQuery } from '@tanstack/react-query';
import { Redirect, useLocalSearchParams, useRouter, type Href } from 'expo-router';
import { Formik } from 'formik';

import { FormErrors, TextField } from '@/features/forms';
import { problemOf, problemWords } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { TextLink } from '@/features/ui/link';
import { Notice } from '@/features/ui/notice';
import { Screen } from '@/features/ui/screen';
import { Body } from '@/features/ui/text';

import { signInForm } from './form';
import { afterSignIn } from './next-address';
import { sessionQueries, useSignIn } from './queries';

export function SignInScreen() {
  const { next } = useLocalSearchParams<{ next?: string }>();
  const router = useRouter();
  const session = useQuery(sessionQueries.current());
  const signIn = useSignIn();

  if (session.data && !signIn.isPending)
    return <Redirect href={afterSignIn(session.data, next) as Href} />;
  return (
    <Screen title="Sign in" backTo="/" width="form">
      <Formik
        initialValues={signInForm.initialValues}
        validationSchema={signInForm.schema}
        validateOnChange={false}
        onSubmit={async (values) => {
          await signIn
            .mutateAsync(signInForm.toRequest(values))
            .then((answer) => {
              if (answer) router.replace(afterSignIn(answer, next) as Href);
            })
            // FormProblem below shows what went wrong.
            .catch(() => undefined);
        }}
      >
        {({ handleSubmit, isSubmitting }) => (
          <Stack>
            <FormErrors />
            {signIn.error ? (
              <Notice kind="error">{problemWords(problemOf(signIn.error))}</Notice>
            ) : null}
            <TextField
              name="email"
              label="E-mail address"
              inputMode="email"
              autoComplete="username"
              required
              onSubmit={handleSubmit}
            />
            <TextField
              name="password"
              label="Password"
              secret
              autoComplete="current-password"
              required
              onSubmit={handleSubmit}
            />
            <Button
              kind="primary"
              label="Sign in"
              wide
              busy={isSubmitting}
              onPress={() => handleSubmit()}
            />
            <Body>
              New here? <TextLink label="Set up your shop" href="/sign-up" />
            </Body>
          </Stack>
        )}
      </Formik>
    </Screen>
  );
}
