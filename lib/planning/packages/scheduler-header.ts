import type { Cluster } from '../cluster';

/** "36:05:00" for 2165 minutes: hours may pass 24, as Slurm, PBS and Grid Engine all allow. */
export function wallClock(minutes: number): string {
  const two = (value: number) => String(value).padStart(2, '0');
  return `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}:00`;
}

/**
 * Directive lines of a job script. Sources: sbatch(1), qsub(1B) of PBS Professional and of Torque,
 * qsub(1) of Grid Engine (h_vmem there counts per slot).
 */
export function schedulerHeader(cluster: Cluster, jobKey: string): string[] {
  const { cores, memoryMb, queue, account } = cluster;
  const wall = wallClock(cluster.wallMinutes);
  const some = (value: string | null, line: (text: string) => string) =>
    value === null ? [] : [line(value)];
  switch (cluster.scheduler) {
    case 'Slurm':
      return [
        `#SBATCH --job-name=${jobKey}`,
        '#SBATCH --nodes=1',
        `#SBATCH --ntasks=${cores}`,
        `#SBATCH --mem=${memoryMb}M`,
        `#SBATCH --time=${wall}`,
        '#SBATCH --output=scheduler-%j.log',
        ...some(queue, (text) => `#SBATCH --partition=${text}`),
        ...some(account, (text) => `#SBATCH --account=${text}`),
      ];
    case 'PBS':
    case 'Torque':
      return [
        `#PBS -N ${jobKey}`,
        cluster.scheduler === 'PBS'
          ? `#PBS -l select=1:ncpus=${cores}:mpiprocs=${cores}:mem=${memoryMb}mb`
          : `#PBS -l nodes=1:ppn=${cores},mem=${memoryMb}mb`,
        `#PBS -l walltime=${wall}`,
        '#PBS -j oe',
        ...some(queue, (text) => `#PBS -q ${text}`),
        ...some(account, (text) => `#PBS -A ${text}`),
      ];
    case 'Grid Engine':
      return [
        `#$ -N ${jobKey}`,
        '#$ -cwd',
        '#$ -S /bin/bash',
        '#$ -j y',
        `#$ -pe ${cluster.parallelEnvironment} ${cores}`,
        `#$ -l h_rt=${wall}`,
        `#$ -l h_vmem=${Math.ceil(memoryMb / cores)}M`,
        ...some(queue, (text) => `#$ -q ${text}`),
        ...some(account, (text) => `#$ -P ${text}`),
      ];
    case 'shell':
      return [];
  }
}

/** The shell word that stands for the folder a job was submitted from. */
export const submitFolder: Record<Cluster['scheduler'], string> = {
  Slurm: '${SLURM_SUBMIT_DIR:-.}',
  PBS: '${PBS_O_WORKDIR:-.}',
  Torque: '${PBS_O_WORKDIR:-.}',
  'Grid Engine': '${SGE_O_WORKDIR:-.}',
  shell: '$(dirname "$0")',
};

export const submitCommand: Record<Cluster['scheduler'], string> = {
  Slurm: 'sbatch job.sh',
  PBS: 'qsub job.sh',
  Torque: 'qsub job.sh',
  'Grid Engine': 'qsub job.sh',
  shell: 'bash job.sh',
};
