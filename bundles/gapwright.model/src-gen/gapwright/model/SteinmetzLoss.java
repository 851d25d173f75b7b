/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Steinmetz Loss</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Core loss per volume k·f^α·B^β in W/m³ with f in Hz and peak B in T, sinusoidal and without bias.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.SteinmetzLoss#getCoefficient <em>Coefficient</em>}</li>
 *   <li>{@link gapwright.model.SteinmetzLoss#getFrequencyExponent <em>Frequency Exponent</em>}</li>
 *   <li>{@link gapwright.model.SteinmetzLoss#getFluxDensityExponent <em>Flux Density Exponent</em>}</li>
 *   <li>{@link gapwright.model.SteinmetzLoss#getMinimumFrequency <em>Minimum Frequency</em>}</li>
 *   <li>{@link gapwright.model.SteinmetzLoss#getMaximumFrequency <em>Maximum Frequency</em>}</li>
 *   <li>{@link gapwright.model.SteinmetzLoss#getTemperature <em>Temperature</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss()
 * @model
 * @generated
 */
public interface SteinmetzLoss extends EObject {
	/**
	 * Returns the value of the '<em><b>Coefficient</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * k, for f in Hz, B in T, loss in W/m³.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Coefficient</em>' attribute.
	 * @see #setCoefficient(double)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_Coefficient()
	 * @model required="true"
	 * @generated
	 */
	double getCoefficient();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getCoefficient <em>Coefficient</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Coefficient</em>' attribute.
	 * @see #getCoefficient()
	 * @generated
	 */
	void setCoefficient(double value);

	/**
	 * Returns the value of the '<em><b>Frequency Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * α.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Frequency Exponent</em>' attribute.
	 * @see #setFrequencyExponent(double)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_FrequencyExponent()
	 * @model required="true"
	 * @generated
	 */
	double getFrequencyExponent();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getFrequencyExponent <em>Frequency Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Frequency Exponent</em>' attribute.
	 * @see #getFrequencyExponent()
	 * @generated
	 */
	void setFrequencyExponent(double value);

	/**
	 * Returns the value of the '<em><b>Flux Density Exponent</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * β.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Flux Density Exponent</em>' attribute.
	 * @see #setFluxDensityExponent(double)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_FluxDensityExponent()
	 * @model required="true"
	 * @generated
	 */
	double getFluxDensityExponent();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getFluxDensityExponent <em>Flux Density Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Flux Density Exponent</em>' attribute.
	 * @see #getFluxDensityExponent()
	 * @generated
	 */
	void setFluxDensityExponent(double value);

	/**
	 * Returns the value of the '<em><b>Minimum Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower end of the range the figures hold for.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Minimum Frequency</em>' attribute.
	 * @see #setMinimumFrequency(Quantity)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_MinimumFrequency()
	 * @model dataType="gapwright.model.Frequency"
	 * @generated
	 */
	Quantity getMinimumFrequency();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getMinimumFrequency <em>Minimum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Minimum Frequency</em>' attribute.
	 * @see #getMinimumFrequency()
	 * @generated
	 */
	void setMinimumFrequency(Quantity value);

	/**
	 * Returns the value of the '<em><b>Maximum Frequency</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper end of the range the figures hold for.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Maximum Frequency</em>' attribute.
	 * @see #setMaximumFrequency(Quantity)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_MaximumFrequency()
	 * @model dataType="gapwright.model.Frequency"
	 * @generated
	 */
	Quantity getMaximumFrequency();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getMaximumFrequency <em>Maximum Frequency</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Maximum Frequency</em>' attribute.
	 * @see #getMaximumFrequency()
	 * @generated
	 */
	void setMaximumFrequency(Quantity value);

	/**
	 * Returns the value of the '<em><b>Temperature</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Temperature the figures hold at.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Temperature</em>' attribute.
	 * @see #setTemperature(Quantity)
	 * @see gapwright.model.GapwrightPackage#getSteinmetzLoss_Temperature()
	 * @model dataType="gapwright.model.Temperature"
	 * @generated
	 */
	Quantity getTemperature();

	/**
	 * Sets the value of the '{@link gapwright.model.SteinmetzLoss#getTemperature <em>Temperature</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Temperature</em>' attribute.
	 * @see #getTemperature()
	 * @generated
	 */
	void setTemperature(Quantity value);

} // SteinmetzLoss
