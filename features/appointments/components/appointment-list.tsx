import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { FormProblem } from '@/features/forms';
import { dayWords, shopDay, whenWords } from '@/features/records';
import { useShop } from '@/features/session';
import { isRefusal } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Sheet } from '@/features/ui/sheet';
import { Body, Small, Strong } from '@/features/ui/text';
import { colors, space, stroke } from '@/features/ui/tokens';
import type { Appointment } from '@/shared/contracts/appointments';

import { TASK_WORDS } from '../form';
import { useEndAppointment } from '../queries';

interface AppointmentListProps {
  label: string;
  appointments: readonly Appointment[];
}

/** Who may do what, with which wheels, by whom and until when. */
export function AppointmentList({ label, appointments }: AppointmentListProps) {
  const { shop, may } = useShop();
  const [asked, setAsked] = useState<Appointment | null>(null);
  return (
    <>
      <View role="list" aria-label={label} style={styles.list}>
        {appointments.map((appointment) => (
          <View key={appointment.id} role="listitem" style={styles.row}>
            <View style={styles.words}>
              <Strong>{appointment.personName}</Strong>
              <Body>{taskWords(appointment)}</Body>
              <Body>{appointment.wheelClass}</Body>
              <Small>{termWords(appointment, shop.timeZone)}</Small>
            </View>
            {may('shop:appoint') && canEnd(appointment, shopDay(shop.timeZone)) ? (
              <Button
                label="End it"
                spoken={`End the appointment of ${appointment.personName}`}
                onPress={() => setAsked(appointment)}
              />
            ) : null}
          </View>
        ))}
      </View>
      {asked ? <EndSheet appointment={asked} onClose={() => setAsked(null)} /> : null}
    </>
  );
}

/** One whose last day is past has ended by itself; one not begun yet can be taken back. */
const canEnd = ({ endedAt, until }: Appointment, today: string) =>
  endedAt === null && (until === null || until >= today);

function taskWords({ tasks }: Appointment): string {
  const words = tasks.map((task) => TASK_WORDS[task].replace(/ wheels$/, '').toLowerCase());
  return `May ${words.length > 1 ? `${words.slice(0, -1).join(', ')} and ` : ''}${words.at(-1) ?? ''}`;
}

function termWords({ from, until, appointedBy, endedAt }: Appointment, timeZone: string): string {
  const term =
    until === null ? `From ${dayWords(from)}` : `${dayWords(from)} to ${dayWords(until)}`;
  const ended = endedAt === null ? '' : `, ended ${whenWords(endedAt, timeZone)}`;
  return `${term}, by ${appointedBy.name}${ended}`;
}

function EndSheet({ appointment, onClose }: { appointment: Appointment; onClose: () => void }) {
  const { shop } = useShop();
  const end = useEndAppointment(shop.id);
  const { id, version, personName } = appointment;
  return (
    <Sheet
      open
      onClose={onClose}
      title="End the appointment"
      shape="box"
      footer={
        <Button
          kind="dangerFilled"
          size="machine"
          wide
          label="End it now"
          busy={end.isPending}
          onPress={() => end.mutate({ id, version }, { onSuccess: onClose })}
        />
      }
    >
      {isRefusal(end.error, 'stale-version') ? (
        <Body>Somebody changed it in the meantime. Close this and look at it first.</Body>
      ) : (
        <FormProblem error={end.error} />
      )}
      <Body>
        {`From now on what ${personName} does with wheels waits for another’s signature. What was done and signed before still counts.`}
      </Body>
    </Sheet>
  );
}

const styles = StyleSheet.create({
  list: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space[3],
    paddingVertical: space[3],
    paddingHorizontal: space[4],
    backgroundColor: colors.sheet,
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 220, minWidth: 0 },
});
