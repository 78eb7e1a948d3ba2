import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useForm } from '@/components/forms/FormRoot';
import { space } from '@/components/theme/tokens';
import { Checkbox } from '@/components/ui/Checkbox';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { Parameter, ParameterKey } from '@/shared/confidence/parameters';
import { sayIn } from '@/shared/units/message';

interface Props<Row extends { key: ParameterKey }> {
  parameters: readonly Parameter[];
  /** What an input begins with when it is taken in. */
  begin: (parameter: Parameter) => Row;
  /** Fields of an input that is varied; `path` is where it stands in the form. */
  children: (parameter: Parameter, path: string, row: Row) => ReactNode;
}

/** The inputs that the case has: which are varied, by how much, and why so much is proposed. */
export function ParameterRows<Row extends { key: ParameterKey }>(props: Props<Row>) {
  const { parameters, begin, children } = props;
  const { formik, errorOf } = useForm();
  const system = useUnitSystem();
  const rows = formik.values.parameters as Row[];
  const set = (next: Row[]) => void formik.setFieldValue('parameters', next);
  const missing = errorOf('parameters');
  return (
    <View style={styles.rows}>
      {parameters.map((parameter) => {
        const { key, label, reason } = parameter;
        const k = rows.findIndex((row) => row.key === key);
        return (
          <View key={key} role="group" aria-label={label} style={styles.row}>
            <Checkbox
              label={label}
              hint={sayIn(system, reason)}
              checked={k >= 0}
              disabled={formik.isSubmitting}
              onChange={(on) =>
                set(on ? [...rows, begin(parameter)] : rows.filter((row) => row.key !== key))
              }
            />
            {k >= 0 ? children(parameter, `parameters[${k}]`, rows[k]) : null}
          </View>
        );
      })}
      {missing ? (
        <Txt role="alert" variant="small" tone="brick" strong>
          {missing}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ rows: { gap: space.one }, row: { gap: space.half } });
