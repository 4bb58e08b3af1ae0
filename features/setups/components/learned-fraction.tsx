import { useState } from 'react';

import { FigureRow, figureText } from '@/features/plan';
import { Button } from '@/features/ui/button';
import { Row } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List } from '@/features/ui/list-row';
import { Body } from '@/features/ui/text';

import { usePlanner } from '../planner-context';
import { PlannerQuantity } from './planner-fields';
import { SparkOutSheet } from './spark-out-sheet';

/** How much of a pass is really cut: computed, or learned from the spark-out of an earlier run when asked to. */
export function LearnedFraction() {
  const { values, plan, setText } = usePlanner();
  const [open, setOpen] = useState(false);
  const learned = values.inputs.cut.softnessPerMm !== null;
  const { rough, finish } = plan.cutFraction;
  const short =
    finish.value === null ? 'not known yet' : figureText(finish, values.units, { digits: 2 });
  return (
    <Fold label="Cut fraction from a run" value={`${learned ? 'learned' : 'computed'}, ${short}`}>
      <Body>
        Of what is set in, the quill gives some back as spring. The plan computes how much; sizes
        read during the spark-out of a run show it.
      </Body>
      <List label="Cut fraction of this plan">
        <FigureRow label="Cut fraction, rough" figure={rough} />
        <FigureRow label="Cut fraction, finish" figure={finish} />
      </List>
      <PlannerQuantity path="cut.softnessPerMm" remark="optional" />
      <Row>
        <Button label="From sizes of a spark-out" icon="working" onPress={() => setOpen(true)} />
        {learned ? (
          <Button
            label="Back to the computed value"
            icon="undo"
            onPress={() => setText('cut.softnessPerMm', '')}
          />
        ) : null}
      </Row>
      <SparkOutSheet
        open={open}
        onClose={() => setOpen(false)}
        onUse={(text) => {
          setText('cut.softnessPerMm', text);
          setOpen(false);
        }}
      />
    </Fold>
  );
}
