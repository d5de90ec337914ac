package org.gasmargin.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import org.gasmargin.gas.OutsideValidity;
import org.gasmargin.gas.catalogue.GasCatalogue;
import org.gasmargin.job.Job;
import org.gasmargin.job.JobErrors;
import org.gasmargin.job.JobReader;
import org.gasmargin.process.ProcedureResult;
import org.gasmargin.process.simulation.Credit;
import org.gasmargin.process.simulation.Simulator;
import org.gasmargin.rules.Judge;
import org.gasmargin.rules.JudgeOn;
import org.gasmargin.rules.Judgement;
import org.gasmargin.rules.JudgingCase;
import org.gasmargin.rules.RulePack;
import org.gasmargin.rules.RulePackErrors;
import org.gasmargin.rules.RulePackLoader;
import org.gasmargin.vessel.MaterialCatalogue;
import org.gasmargin.worksheet.WorksheetContent;

/**
 * The way of one job from its file to a judged result.
 *
 * @param content all that the outputs are written from
 */
record JobCheck(WorksheetContent content) {

  /**
   * Reads, simulates and judges a job.
   *
   * @throws InputRefused with a line for everything that the user can put right
   */
  static JobCheck of(Path file) {
    // Packs take as long to check as the job to simulate; both are done at once.
    CompletableFuture<List<RulePack>> loading =
        CompletableFuture.supplyAsync(RulePackLoader::loadBuiltIn);
    Job job = read(file);
    ProcedureResult result = simulate(file, job);
    List<RulePack> packs = loaded(loading);
    Judgement judgement =
        Judge.judge(
            new JudgingCase(result, job.limits(), job.judgeOn(), job.rulePacks(), job.units()),
            packs);
    return new JobCheck(
        new WorksheetContent(
            job.title(),
            job.number(),
            job.revision(),
            job.preparedBy(),
            result,
            job.limits(),
            judgement,
            job.entries(),
            job.units(),
            sha256(job.text()),
            ProgramVersion.number()));
  }

  private static List<RulePack> loaded(CompletableFuture<List<RulePack>> loading) {
    try {
      return loading.join();
    } catch (CompletionException failed) {
      if (failed.getCause() instanceof RulePackErrors refused) {
        throw InputRefused.with(refused.issues());
      }
      throw failed;
    }
  }

  private static Job read(Path file) {
    try {
      return new JobReader(
              new GasCatalogue(), MaterialCatalogue.load(), RulePackLoader.builtInNames())
          .read(file);
    } catch (JobErrors errors) {
      throw InputRefused.with(errors.issues());
    }
  }

  private static ProcedureResult simulate(Path file, Job job) {
    try {
      return new Simulator()
          .simulate(
              job.procedure(), job.judgeOn() == JudgeOn.MODELLED ? Credit.MODELLED : Credit.NONE);
    } catch (OutsideValidity start) {
      throw new InputRefused(
          List.of(file + ": the start of a vessel cannot be computed: " + start.getMessage()));
    }
  }

  /** Hash of the job file, as {@code sha256sum} prints it; those of the packs stand beside it. */
  private static String sha256(String text) {
    try {
      byte[] digest =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return HexFormat.of().formatHex(digest);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}
