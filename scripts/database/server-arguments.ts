import os from "node:os";
import type { DatabaseFolder } from "./database-folder";

/**
 * Every option of the server, nothing taken from the machine's own files. With `durable` off (tests alone) a commit
 * does not wait for the disk.
 */
export function serverArguments(folder: DatabaseFolder, port: number, durable: boolean): string[] {
  return [
    "--no-defaults",
    `--user=${os.userInfo().username}`,
    `--datadir=${folder.data}`,
    `--socket=${folder.socket}`,
    `--pid-file=${folder.pidFile}`,
    "--bind-address=127.0.0.1",
    `--port=${port}`,
    "--skip-name-resolve",
    "--max-connections=200",
    "--max-allowed-packet=64M",
    "--local-infile=OFF",
    "--performance-schema=OFF",
    "--character-set-server=utf8mb4",
    "--collation-server=utf8mb4_unicode_ci",
    "--default-time-zone=+00:00",
    "--sql-mode=STRICT_ALL_TABLES,STRICT_TRANS_TABLES,NO_ZERO_DATE,NO_ZERO_IN_DATE,ERROR_FOR_DIVISION_BY_ZERO,NO_AUTO_CREATE_USER,NO_ENGINE_SUBSTITUTION",
    `--innodb-flush-log-at-trx-commit=${durable ? 1 : 0}`,
    `--sync-binlog=${durable ? 1 : 0}`,
    "--innodb-rollback-on-timeout=ON",
    "--innodb-lock-wait-timeout=5",
    "--idle-transaction-timeout=15",
    "--innodb-buffer-pool-size=256M",
    "--server-id=1",
    "--log-bin=binlog",
    "--binlog-format=ROW",
    "--binlog-expire-logs-seconds=604800",
    // Without it a user who may make triggers could not, once there is a binary log.
    "--log-bin-trust-function-creators=ON",
  ];
}
