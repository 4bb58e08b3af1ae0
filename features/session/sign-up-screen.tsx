import { useRouter } from 'expo-router';
import { Formik } from 'formik';
import { useState } from 'react';

import { fieldErrorsOf, FormErrors, FormProblem, TextField } from '@/features/forms';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { TextLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Segmented } from '@/features/ui/segmented';
import { Body } from '@/features/ui/text';

import { signUpForm } from './form';
import { useSignUp } from './queries';
import { TimeZoneSelect } from './time-zone-select';

export function SignUpScreen() {
  const router = useRouter();
  const signUp = useSignUp();
  const [initialValues] = useState(signUpForm.initialValues);
  return (
    <Screen title="Set up your shop" backTo="/" width="form">
      <Formik
        initialValues={initialValues}
        validationSchema={signUpForm.schema}
        validateOnChange={false}
        onSubmit={async (values, helpers) => {
          const body = signUpForm.toRequest(values);
          try {
            await signUp.mutateAsync(body);
            router.replace({ pathname: '/shops/[shopId]', params: { shopId: body.shopId } });
          } catch (error) {
            const fields = fieldErrorsOf(error);
            if (fields) helpers.setErrors(fields);
          }
        }}
      >
        {({ handleSubmit, isSubmitting, values, setFieldValue }) => (
          <Stack>
            <Body>
              You become the lead of a new shop. Wheels, machines and people are added inside.
            </Body>
            <FormErrors />
            <FormProblem error={fieldErrorsOf(signUp.error) ? null : signUp.error} />
            <TextField name="shopName" label="Shop" autoComplete="organization" required />
            <TextField name="name" label="Your name" autoComplete="name" required />
            <TextField
              name="email"
              label="E-mail address"
              inputMode="email"
              autoComplete="username"
              required
            />
            <TextField
              name="password"
              label="Password"
              hint="15 characters or more. A few words in a row are easy to keep; a password manager keeps them for you."
              secret
              autoComplete="new-password"
              required
            />
            <Segmented
              name="units"
              label="Units of the shop"
              options={[
                { value: 'mm', label: 'Millimetres' },
                { value: 'inch', label: 'Inches' },
              ]}
              value={values.units}
              onChange={(units) => void setFieldValue('units', units)}
              hint="Each person can read in the other at any time."
            />
            <TimeZoneSelect
              value={values.timeZone}
              onChange={(zone) => void setFieldValue('timeZone', zone)}
            />
            <Button
              kind="primary"
              label="Set up the shop"
              wide
              busy={isSubmitting}
              onPress={() => handleSubmit()}
            />
            <Body>
              Already a member? <TextLink label="Sign in" href="/sign-in" />
            </Body>
          </Stack>
        )}
      </Formik>
    </Screen>
  );
}
