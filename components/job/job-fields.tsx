import type { FieldErrors, UseFormRegister } from 'react-hook-form'
import { TextField } from '@/components/ui/text-field'
import type { JobForm } from '@/lib/schemas/job'
import { NotesField } from './notes-field'

interface Props {
  register: UseFormRegister<JobForm>
  errors: FieldErrors<JobForm>
}

/** What a job says of itself. */
export function JobFields({ register, errors }: Props) {
  return (
    <>
      <TextField label="Job" hint="As the shop calls it." fault={errors.name?.message} {...register('name')} />
      <TextField
        label="Place"
        hint="Street, building, which stair."
        fault={errors.place?.message}
        {...register('place')}
      />
      <TextField label="For" fault={errors.client?.message} {...register('client')} />
      <NotesField label="Notes" fault={errors.notes?.message} {...register('notes')} />
    </>
  )
}
