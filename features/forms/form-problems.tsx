import { useFormikContext } from 'formik';

import { isRefusal, problemOf, problemWords, useEndSession } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { ErrorSummary } from '@/features/ui/error-summary';
import { useFieldIdsOf } from '@/features/ui/field-ids';
import { Notice } from '@/features/ui/notice';

interface FlatError {
  name: string;
  message: string;
}

/** Formik's tree of errors as a list, in the order of the form's fields. */
function flatten(errors: unknown, path = ''): FlatError[] {
  if (typeof errors === 'string') return [{ name: path, message: errors }];
  if (typeof errors !== 'object' || errors === null) return [];
  return Object.entries(errors).flatMap(([key, value]) =>
    flatten(value, key.includes('.') ? `${path}["${key}"]` : path ? `${path}.${key}` : key),
  );
}

/** After submit: everything that must be put right, with links to the fields. */
export function FormErrors() {
  const { errors, submitCount, isSubmitting } = useFormikContext();
  const idsOf = useFieldIdsOf();
  if (submitCount === 0 || isSubmitting) return null;
  const list = flatten(errors).map(({ name, message }) => ({
    fieldId: idsOf(name).input,
    message,
  }));
  return <ErrorSummary errors={list} attempt={submitCount} />;
}

/** A refusal that belongs to no field. Who is signed out finds the way in; drafts wait on the device. */
export function FormProblem({ error }: { error: unknown }) {
  const signIn = useEndSession();
  if (!error) return null;
  if (isRefusal(error, 'unauthenticated'))
    return (
      <Notice kind="error" action={<Button label="Sign in" onPress={signIn} />}>
        You are signed out. What you typed is kept on this device; sign in and go on.
      </Notice>
    );
  return <Notice kind="error">{problemWords(problemOf(error))}</Notice>;
}

/**
 * The server's errors by field, as Formik takes them; null when the problem names no field of this form.
 * `nameOf` turns the server's path into the form's.
 */
export function fieldErrorsOf(
  error: unknown,
  nameOf: (path: string) => string = (path) => path,
): Record<string, string> | null {
  const problem = problemOf(error);
  if (problem.kind !== 'refused' || !problem.details.errors?.length) return null;
  return Object.fromEntries(
    problem.details.errors.map(({ path, message }) => [nameOf(path), message]),
  );
}
